/** Workings in MathML, line by line. */

import { mathElement, nameToMathML } from '../../expression/index.ts';
import type { WrittenLine, WrittenTerm } from './written-workings.ts';

const UPRIGHT_D = '<mi mathvariant="normal">d</mi>';
const DERIVATIVE = `<mfrac>${UPRIGHT_D}<mrow>${UPRIGHT_D}<mi>t</mi></mrow></mfrac>`;

/** The lines as one `math` element, signs of equality under each other. */
export function linesMathml(lines: readonly WrittenLine[]): string {
  const rows = lines.map(
    line =>
      `<mtr>${sidesOf(line)
        .map(side => `<mtd>${side}</mtd>`)
        .join('')}</mtr>`,
  );
  return mathElement(`<mtable displaystyle="true">${rows.join('')}</mtable>`, 'block');
}

/** One line as one element, without the enclosing `math`. */
export function lineMathml(line: WrittenLine): string {
  return `<mrow>${sidesOf(line).join('')}</mrow>`;
}

/** Left side, sign of equality, right side. */
function sidesOf({ left, isDerivative, terms }: WrittenLine): readonly string[] {
  const name = `${isDerivative ? DERIVATIVE : ''}${nameToMathML(left)}`;
  const right = terms.length === 0 ? '<mn>0</mn>' : terms.map(mathTerm).join('');
  return [`<mrow>${name}</mrow>`, '<mo>=</mo>', `<mrow>${right}</mrow>`];
}

function mathTerm({ isNegative, coefficient, of }: WrittenTerm, i: number): string {
  const sign = isNegative ? '<mo>−</mo>' : i === 0 ? '' : '<mo>+</mo>';
  if (coefficient === null) return sign + nameToMathML(of);
  const { isSum, mathml } = coefficient;
  const shown = isSum ? `<mrow><mo>(</mo>${mathml}<mo>)</mo></mrow>` : mathml;
  return `${sign}${shown}<mo>⋅</mo>${nameToMathML(of)}`;
}
