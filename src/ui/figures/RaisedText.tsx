import { raisedRuns } from './format.ts';

/** Text whose raised characters (10⁻⁶, s⁻¹) are set with `sup`, in the face of the rest. */
export function RaisedText({ text }: { readonly text: string }) {
  const runs = raisedRuns(text);
  if (runs.every(run => !run.isRaised)) return text;
  return (
    <span className="raised-text">
      {runs.map((run, index) =>
        // biome-ignore lint/suspicious/noArrayIndexKey: runs of one text never move
        run.isRaised ? <sup key={index}>{run.text}</sup> : <span key={index}>{run.text}</span>,
      )}
    </span>
  );
}
