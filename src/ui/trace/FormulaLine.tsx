import { Fragment } from 'react';
import { MathName } from '../figures/index.ts';

/** An expression on one line with its names set as on the sheet: `K_p*R/J` with a lowered p and points for products. */
export function FormulaLine({ text }: { readonly text: string }) {
  return (
    <span className="trace-formula">
      {text.split(/([A-Za-z][A-Za-z0-9_.]*)/).map((part, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: parts of one text never move
        <Fragment key={index}>
          {index % 2 === 1 ? <MathName name={part} /> : part.replaceAll('*', '·').replaceAll('-', '−')}
        </Fragment>
      ))}
    </span>
  );
}
