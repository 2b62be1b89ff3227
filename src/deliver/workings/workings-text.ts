/** Workings as plain text and as LaTeX. */

import { nameToLatex } from '../../expression/index.ts';
import { CAUTION } from '../caution.ts';
import { oneLine, wrapped } from '../one-line.ts';
import { type WorkingsContext, type WrittenLine, type WrittenTerm, writtenWorkings } from './written-workings.ts';

const WIDTH = 100;

/** Title, then each section under its heading with a line for each equation, then the caution. */
export function writeWorkingsText(context: WorkingsContext): string {
  const { sections, note } = writtenWorkings(context);
  return [
    oneLine(context.diagram.title),
    ...(note === '' ? [] : ['', note]),
    ...sections.flatMap(({ title, remarks, lines }) => [
      '',
      oneLine(title),
      '-'.repeat(Array.from(oneLine(title)).length),
      ...remarks.map(oneLine),
      ...lines.map(textLine),
    ]),
    '',
    ...wrapped(CAUTION, WIDTH),
    '',
  ].join('\n');
}

/** One line as plain text. */
export function textLine({ left, isDerivative, terms }: WrittenLine): string {
  const name = oneLine(left);
  return `${isDerivative ? `d/dt ${name}` : name} = ${joined(terms, textTerm)}`;
}

const textTerm = ({ coefficient, of }: WrittenTerm) => {
  if (coefficient === null) return oneLine(of);
  return `${coefficient.isSum ? `(${coefficient.text})` : coefficient.text}*${oneLine(of)}`;
};

/** The same as LaTeX: a section under a comment, its equations aligned at their signs of equality. */
export function writeWorkingsLatex(context: WorkingsContext): string {
  const { sections, note } = writtenWorkings(context);
  const comments = [oneLine(context.diagram.title), note, CAUTION].filter(each => each !== '');
  return [
    ...comments.flatMap(each => wrapped(each, WIDTH)).map(line => `% ${line}`),
    ...sections.flatMap(({ title, remarks, lines }) => [
      '',
      `% ${oneLine(title)}`,
      ...remarks.map(remark => `% ${oneLine(remark)}`),
      ...(lines.length === 0 ? [] : ['\\[\\begin{array}{rcl}', ...lines.map(latexLine), '\\end{array}\\]']),
    ]),
    '',
  ].join('\n');
}

function latexLine({ left, isDerivative, terms }: WrittenLine): string {
  const name = nameToLatex(left);
  const whole = isDerivative ? `\\frac{\\mathrm{d}}{\\mathrm{d}t} ${name}` : name;
  return `  ${whole} & = & ${joined(terms, latexTerm)} \\\\`;
}

const latexTerm = ({ coefficient, of }: WrittenTerm) => {
  if (coefficient === null) return nameToLatex(of);
  const { isSum, latex } = coefficient;
  return `${isSum ? `\\left(${latex}\\right)` : latex} \\, ${nameToLatex(of)}`;
};

function joined(terms: readonly WrittenTerm[], print: (term: WrittenTerm) => string): string {
  if (terms.length === 0) return '0';
  const signed = (term: WrittenTerm, i: number) =>
    i === 0 ? (term.isNegative ? '-' : '') : term.isNegative ? ' - ' : ' + ';
  return terms.map((term, i) => signed(term, i) + print(term)).join('');
}
