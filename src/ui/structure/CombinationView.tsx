import { Fragment } from 'react';
import type { Rational } from '../../algebra/index.ts';
import { formatFraction, formatNumber, isWritableFraction, MathName, MINUS } from '../figures/index.ts';

interface CombinationViewProps {
  readonly terms: readonly { readonly name: string; readonly factor: Rational }[];
}

/** `ω + 2 F − 1/3 q`; 0 where there is no term. */
export function CombinationView({ terms }: CombinationViewProps) {
  if (terms.length === 0) return <>0</>;
  return (
    <span className="structure-combination">
      {terms.map(({ name, factor }, k) => (
        <Fragment key={name}>
          {factor.n < 0n ? (k === 0 ? MINUS : ` ${MINUS} `) : k > 0 && ' + '}
          {magnitudeText(factor)}
          <MathName name={name} />
        </Fragment>
      ))}
    </span>
  );
}

function magnitudeText({ n, d }: Rational): string {
  const magnitude = { n: n < 0n ? -n : n, d };
  if (magnitude.n === 1n && d === 1n) return '';
  return `${isWritableFraction(magnitude) ? formatFraction(magnitude) : formatNumber(magnitude)} `;
}
