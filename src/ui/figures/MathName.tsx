import { nameSpans, type Span } from '../../expression/index.ts';

/** The name of a signal or parameter as printed: `K_p` is K with a lowered p, `omega` is ω, a group's part keeps its point. */
export function MathName({ name }: { readonly name: string }) {
  return (
    <span className="math-name">
      {nameSpans(name).map((span, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: spans of one name never move
        <NameSpan key={index} span={span} />
      ))}
    </span>
  );
}

/** The one letter that `name` is printed as, with or without an index, so that it may carry a dot; null for a word. */
export function singleLetter(name: string): string | null {
  const [letter, ...others] = nameSpans(name);
  const isOne =
    letter !== undefined && [...letter.text].length === 1 && others.every(({ script }) => script !== 'normal');
  return isOne ? letter.text : null;
}

function NameSpan({ span }: { readonly span: Span }) {
  const text = span.italic ? <i>{span.text}</i> : span.text;
  switch (span.script) {
    case 'normal':
      return text;
    case 'sub':
      return <sub>{text}</sub>;
    case 'sup':
      return <sup>{text}</sup>;
    default:
      return span.script satisfies never;
  }
}
