/**
 * Numbers and mathematics for the screen: figures that show only right digits, names, polynomials and transfer functions as
 * MathML, and the tree of elements that formulas and plots are made of.
 */

import './figures.css';

export { CopyFormula } from './CopyFormula.tsx';
export { FormulaView } from './FormulaView.tsx';
export type { Figure } from './figure.ts';
export { figureOf, rightDigits } from './figure.ts';
export type { TextRun } from './format.ts';
export {
  figureText,
  formatFraction,
  formatNumber,
  formatPadded,
  formatUnit,
  MINUS,
  raised,
  raisedRuns,
} from './format.ts';
export { MarkupView } from './MarkupView.tsx';
export { MathName, singleLetter } from './MathName.tsx';
export { degreesText, frequencyText, phaseMarginText } from './margin-text.ts';
export type { Markup } from './markup.ts';
export { element, markupText } from './markup.ts';
export { Polynomial } from './Polynomial.tsx';
export type { Notation } from './polynomial-terms.ts';
export { isWritableFraction } from './polynomial-terms.ts';
export { RaisedText } from './RaisedText.tsx';
export type { Motion, Root, RootRow } from './roots.ts';
export { motionOf, rootRows, rootText, singleRootText } from './roots.ts';
export type { Real } from './rounded-digits.ts';
export { TransferFunction } from './TransferFunction.tsx';
export { useContainerWidth } from './useContainerWidth.ts';
