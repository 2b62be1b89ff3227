import { useState } from 'react';

interface CopyFormulaProps {
  readonly latex: string;
  readonly mathml: string;
}

type CopyState = 'ready' | 'copied' | 'refused';

const LABELS: Readonly<Record<CopyState, string>> = { ready: 'Copy', copied: 'Copied', refused: 'Not allowed' };

/** Copies a formula: LaTeX where plain text is pasted, MathML where a document takes it. */
export function CopyFormula({ latex, mathml }: CopyFormulaProps) {
  // Remembers which formula was copied: a changed one is ready to copy again.
  const [last, setLast] = useState<{ readonly latex: string; readonly state: CopyState } | null>(null);
  const state = last?.latex === latex ? last.state : 'ready';
  const copy = async () => {
    const kinds = { 'text/plain': latex, 'text/html': mathml };
    const blobs = Object.entries(kinds).map(([type, text]) => [type, new Blob([text], { type })] as const);
    try {
      await navigator.clipboard.write([new ClipboardItem(Object.fromEntries(blobs))]);
      setLast({ latex, state: 'copied' });
    } catch {
      // The browser keeps the clipboard closed; the button says so.
      setLast({ latex, state: 'refused' });
    }
  };
  return (
    <button type="button" className="copy-formula" title="Copy as LaTeX and MathML" onClick={copy}>
      {LABELS[state]}
    </button>
  );
}
