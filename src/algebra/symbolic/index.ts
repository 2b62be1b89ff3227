/**
 * Rational functions of the parameters, exact and in lowest terms: the symbolic field, the solution of a loop in symbols,
 * and formulas on paper. Start at `createSymbolicField`; run what uses it in `withinEffort`.
 */

export { coefficientsIn } from './coefficients.ts';
export {
  DEFAULT_LIMITS,
  Effort,
  type EffortLimit,
  type EffortLimits,
  type EffortOutcome,
  EffortSpent,
  withinEffort,
} from './effort.ts';
export { evaluateAt, substitute } from './evaluate.ts';
export { denominatorFactors } from './factors.ts';
export type { Formula } from './formula.ts';
export { formulaLatex } from './formula-latex.ts';
export { formulaMathML } from './formula-mathml.ts';
export { type FormulaOptions, formulaOf } from './formula-of.ts';
export { formulaC, formulaPython, formulaText, type NameSpelling } from './formula-text.ts';
export type { SymbolicPolynomial } from './polynomial.ts';
export { type RationalFunction, rationalFunction } from './rational-function.ts';
export { type SymbolicSolution, solveSymbolic } from './solve.ts';
export { createSymbolicField, type SymbolicField } from './symbolic-field.ts';
