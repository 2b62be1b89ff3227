/** What a transfer function looks like, all ways: as one fraction, as wrapped lines, as text to copy. */

import type { Markup } from './markup.ts';
import { markupText } from './markup.ts';
import { isOne, leadIn, mathElement, quotientRow } from './polynomial-markup.ts';
import { hasRoundedTerm, type Notation, polynomialTerms, type Term } from './polynomial-terms.ts';
import { quotientLatex, quotientWords } from './polynomial-text.ts';
import { polynomialEms } from './polynomial-width.ts';
import type { Real } from './rounded-digits.ts';

/** A transfer function ready to be shown or copied. */
export interface TransferFunctionView {
  readonly numerator: readonly Term[];
  readonly denominator: readonly Term[];
  readonly isRounded: boolean;
  /** Whether there is a denominator to write. */
  readonly isQuotient: boolean;
  /** `G(s) = N/D` as one `math` element, labelled in words. */
  readonly formula: Markup;
  /** Estimated width of `formula`, ems. */
  readonly ems: number;
  /** The formula for the clipboard. */
  readonly latex: string;
  readonly mathml: string;
}

/** The MathML namespace (W3C MathML Core, section 2.1). */
const MATHML = 'http://www.w3.org/1998/Math/MathML';

/** Width of `G(s) =` in front of the fraction, ems. */
const LEAD_IN_EMS = 3.2;

/** The view of numerator over denominator, both in descending powers of `variable`. */
export function transferFunctionView(
  name: string,
  numerator: readonly Real[],
  denominator: readonly Real[],
  notation: Notation,
  variable: string,
): TransferFunctionView {
  const top = polynomialTerms(numerator, notation);
  const bottom = polynomialTerms(denominator, notation);
  const isRounded = hasRoundedTerm(top) || hasRoundedTerm(bottom);
  const equals = isRounded ? 'is about' : 'equals';
  const label = `${name} of ${variable} ${equals} ${quotientWords(top, bottom, variable)}`;
  const formula = mathElement(label, 'block', leadIn(name, variable, isRounded), quotientRow(top, bottom, variable));
  const sign = isRounded ? '\\approx' : '=';
  return {
    numerator: top,
    denominator: bottom,
    isRounded,
    isQuotient: !isOne(bottom),
    formula,
    ems: LEAD_IN_EMS + Math.max(polynomialEms(top), polynomialEms(bottom)),
    latex: `${name}(${variable}) ${sign} ${quotientLatex(top, bottom, variable)}`,
    mathml: markupText({ ...formula, attributes: { xmlns: MATHML, ...formula.attributes } }),
  };
}
