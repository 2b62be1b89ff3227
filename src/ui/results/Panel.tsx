import { type ReactNode, useId } from 'react';

interface PanelProps {
  readonly title: string;
  /** At the right of the title: a choice, or how the figures are known. */
  readonly aside?: ReactNode;
  readonly children: ReactNode;
}

/** One section of the results under its title. */
export function Panel({ title, aside, children }: PanelProps) {
  const id = useId();
  return (
    <section className="panel" aria-labelledby={id}>
      <header className="panel-head">
        <h2 id={id} className="panel-title">
          {title}
        </h2>
        {aside !== undefined && <div className="panel-aside">{aside}</div>}
      </header>
      {children}
    </section>
  );
}
