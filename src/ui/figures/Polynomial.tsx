import { MarkupView } from './MarkupView.tsx';
import { element, type Markup } from './markup.ts';
import { termRows } from './polynomial-markup.ts';
import { type Notation, polynomialTerms, type Term } from './polynomial-terms.ts';
import { polynomialWords } from './polynomial-text.ts';
import type { Real } from './rounded-digits.ts';

interface PolynomialProps {
  /** In descending powers; none for zero. */
  readonly coefficients: readonly Real[];
  readonly notation: Notation;
  readonly variable?: string;
}

/** A polynomial that wraps between its terms. */
export function Polynomial({ coefficients, notation, variable = 's' }: PolynomialProps) {
  return <WrappedTerms terms={polynomialTerms(coefficients, notation)} variable={variable} />;
}

interface WrappedTermsProps {
  readonly terms: readonly Term[];
  readonly variable: string;
  /** What stands in front of the first term. */
  readonly leadIn?: Markup;
  readonly leadInWords?: string;
}

/** Terms as one `math` each, since a single one never breaks over lines; read out as a whole. */
export function WrappedTerms({ terms, variable, leadIn, leadInWords = '' }: WrappedTermsProps) {
  const rows = leadIn === undefined ? termRows(terms, variable) : [leadIn, ...termRows(terms, variable)];
  return (
    <span className="polynomial" role="math" aria-label={leadInWords + polynomialWords(terms, variable)}>
      {rows.map((row, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: a term is its place
        <span className="polynomial-term" key={index}>
          <MarkupView tree={element('math', { 'aria-hidden': 'true' }, row)} />{' '}
        </span>
      ))}
    </span>
  );
}
