/** The report: one HTML file that needs no other, to read on a screen or to print. */

import { poles, type Root } from '../../analysis/index.ts';
import { placeUnplaced } from '../../diagram/arranging/index.ts';
import type { Diagram } from '../../diagram/index.ts';
import { mathElement, nameToMathML, toMathML } from '../../expression/index.ts';
import { CAUTION } from '../caution.ts';
import type { ModelContext } from '../format.ts';
import { formulasOf } from '../formulas.ts';
import { writeMathml } from '../mathml.ts';
import { modelWarnings } from '../model-file.ts';
import { oneLine } from '../one-line.ts';
import { escaped, sheetSvg } from '../sheet-svg/index.ts';
import { linesMathml } from './workings-mathml.ts';
import { writtenWorkings } from './written-workings.ts';

const STYLE = `body{font-family:serif;max-width:60rem;margin:2rem auto;padding:0 1rem;color:#000;background:#fff}
svg{max-width:100%;height:auto}table{border-collapse:collapse}th,td{padding:.2rem .8rem;text-align:left}
th{border-bottom:1px solid}.wide{overflow-x:auto}.caution{border:1px solid;padding:.5rem 1rem}
@media print{body{margin:0;max-width:none}.wide{overflow:visible}section{break-inside:avoid-page}}`;

/** Drawing, parameters, workings, matrices, poles, self-check, warnings and caution. */
export function writeReport(context: ModelContext): string {
  const { diagram, derivation } = context;
  const title = oneLine(diagram.title) || 'Block diagram';
  return [
    '<!DOCTYPE html>',
    `<html lang="en"><head><meta charset="utf-8"><title>${escaped(title)}</title><style>${STYLE}</style></head><body>`,
    `<h1>${escaped(title)}</h1>`,
    part('Drawing', drawingOf(diagram)),
    part('Parameters', parametersOf(diagram)),
    part('Workings', workingsOf(context)),
    part('Matrices', matricesOf(context)),
    part('Poles', polesOf(context)),
    part('Self-check', `<p>${checkOf(context)}</p>`),
    part('Warnings', listOf(modelWarnings(derivation).map(({ message }) => message))),
    `<p class="caution">${escaped(CAUTION)}</p>`,
    '</body></html>',
    '',
  ].join('\n');
}

function part(title: string, content: string): string {
  return `<section><h2>${title}</h2>\n${content}\n</section>`;
}

/** The SVG, blocks without a place arranged, without what only stands at the head of a file of its own. */
function drawingOf(diagram: Diagram): string {
  return sheetSvg(placeUnplaced(diagram), { titleBlock: false }).replace(/^<\?xml[^>]*\?>\s*/, '');
}

/** The equations without the comment before them, and what is to be said of formulas. */
function matricesOf(context: ModelContext): string {
  const note = context.notation === 'symbols' ? formulasOf(context).note : '';
  const said = note === '' ? '' : `<p>${escaped(note)}</p>`;
  return `${said}<div class="wide">${writeMathml(context).replace(/^<!--[\s\S]*?-->\s*/, '')}</div>`;
}

function table(heads: readonly string[], rows: readonly (readonly string[])[]): string {
  if (rows.length === 0) return '<p>None.</p>';
  const cells = (row: readonly string[], tag: string) => row.map(cell => `<${tag}>${cell}</${tag}>`).join('');
  return `<table><tr>${cells(heads, 'th')}</tr>${rows.map(row => `<tr>${cells(row, 'td')}</tr>`).join('')}</table>`;
}

function parametersOf({ parameters }: Diagram): string {
  const rows = parameters.map(({ name, value, unit = '', tolerance = '', note = '' }) => [
    mathElement(nameToMathML(name)),
    mathElement(toMathML(value)),
    ...[unit, tolerance, note].map(escaped),
  ]);
  return table(['Name', 'Value', 'Unit', 'Tolerance', 'Note'], rows);
}

function listOf(sentences: readonly string[]): string {
  if (sentences.length === 0) return '<p>None.</p>';
  return `<ul>${sentences.map(sentence => `<li>${escaped(sentence)}</li>`).join('')}</ul>`;
}

function polesOf({ derivation }: ModelContext): string {
  const found = poles(derivation.model, 'high');
  if (found.route === 'not-converged') return '<p>Not computed: the iteration did not converge.</p>';
  const parts = ({ re, im, multiplicity }: Root) => [String(re), String(im), String(multiplicity)];
  return table(['Real part, 1/s', 'Imaginary part, 1/s', 'Multiplicity'], found.poles.map(parts));
}

function checkOf({ derivation: { selfCheck } }: ModelContext): string {
  const { passed, error, limit } = selfCheck;
  return `${passed ? 'Passed' : 'Not passed'}: largest relative difference ${error}, limit ${limit}.`;
}

function workingsOf(context: ModelContext): string {
  const { sections, note } = writtenWorkings(context);
  const written = sections.map(({ title, remarks, lines }) => {
    const said = remarks.map(remark => `<p>${escaped(remark)}</p>`).join('');
    const math = lines.length === 0 ? '' : linesMathml(lines);
    return `<h3>${escaped(title)}</h3>${said}<div class="wide">${math}</div>`;
  });
  return [...(note === '' ? [] : [`<p>${escaped(note)}</p>`]), ...written].join('\n');
}
