/** Names and expressions as people write them: on one line, as LaTeX, as MathML. Nothing is evaluated. */

export { inlineMath, nameSpans, type Span } from './inline.ts';
export { escapeLatex, nameToLatex, toLatex } from './latex.ts';
export { escapeXml, mathElement, nameToMathML, toMathML } from './mathml.ts';
export { plainName } from './name-parts.ts';
