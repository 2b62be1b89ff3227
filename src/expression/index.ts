/**
 * Text to value: quantities, polynomials in s, and their notation on the screen (format.md, Expressions). Problems from here
 * name no block; whoever asked puts it in front. Stands above algebra, below the diagram.
 */

export { evaluateExpression, evaluateQuantity, type Scope } from './evaluate.ts';
export { evaluateIn, evaluatePolynomialIn, type Lookup } from './evaluate-in.ts';
export { evaluatePolynomial, polynomialAsWritten } from './evaluate-polynomial.ts';
export type { BinaryOperator, Expression, Value } from './expression.ts';
export { fold } from './fold.ts';
export { FUNCTION_NAMES, type FunctionName } from './functions.ts';
export { hasLaplaceVariable, namesIn, parameterNameFault, renameIn } from './names.ts';
export {
  escapeLatex,
  escapeXml,
  inlineMath,
  mathElement,
  nameSpans,
  nameToLatex,
  nameToMathML,
  plainName,
  type Span,
  toLatex,
  toMathML,
} from './notation/index.ts';
export { evaluateParameters, type ParameterText } from './parameters.ts';
export { parseExpression } from './parse.ts';
export { print } from './print.ts';
export { nearestName } from './spelling.ts';
export { evaluateTolerance } from './tolerance.ts';
export { onOneLine, quote } from './wording.ts';
