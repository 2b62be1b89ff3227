import { useState } from 'react';

type CopyState = 'ready' | 'copied' | 'refused';

const LABELS: Readonly<Record<CopyState, string>> = {
  ready: 'Copy as plain text',
  copied: 'Copied as plain text',
  refused: 'Not allowed',
};

/** Copies a text and says on the button whether the browser took it; a changed text is ready to copy again. */
export function CopyText({ text }: { readonly text: string }) {
  const [last, setLast] = useState<{ readonly text: string; readonly state: CopyState } | null>(null);
  const state = last?.text === text ? last.state : 'ready';
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(text);
      setLast({ text, state: 'copied' });
    } catch {
      // The browser keeps the clipboard closed; the button says so.
      setLast({ text, state: 'refused' });
    }
  };
  return (
    <button type="button" className="button" onClick={copy}>
      <span aria-live="polite">{LABELS[state]}</span>
    </button>
  );
}
