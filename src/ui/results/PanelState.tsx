import type { ReactNode } from 'react';

/** A panel whose answer is being worked out; the words appear only after a moment, so that quick answers do not flash. */
export function PanelPending({ label }: { readonly label: string }) {
  return (
    <p className="panel-pending" role="status">
      <span className="panel-pending-words">{label}: working it out…</span>
    </p>
  );
}

/** A panel that has nothing to show, and why. */
export function PanelEmpty({ children }: { readonly children: ReactNode }) {
  return <p className="panel-empty">{children}</p>;
}
