/** A modal dialog on the platform's own element: focus held inside, Escape closes, focus returns to where it was. */

import './dialogs.css';
import { type ReactNode, useEffect, useRef } from 'react';
import { actions } from '../store/index.ts';

interface DialogProps {
  readonly title: string;
  readonly children: ReactNode;
}

export function Dialog({ title, children }: DialogProps) {
  const element = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const from = document.activeElement;
    element.current?.showModal();
    return () => {
      if (from instanceof HTMLElement) from.focus();
    };
  }, []);
  return (
    <dialog ref={element} className="dialog" aria-labelledby="dialog-title" onClose={() => actions.openDialog(null)}>
      <div className="dialog-head">
        <h2 id="dialog-title">{title}</h2>
        <button type="button" className="button" onClick={() => actions.openDialog(null)}>
          Close
        </button>
      </div>
      {children}
    </dialog>
  );
}
