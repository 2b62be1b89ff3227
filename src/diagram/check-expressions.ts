/**
 * What the texts of a drawing say, asked without deriving a model: every expression of every parameter and block, evaluated.
 * For the screen, where a wrong text is shown beside its field, and for edits that want to know before they are made.
 */

import {
  evaluateParameters,
  evaluatePolynomial,
  evaluateQuantity,
  evaluateTolerance,
  onOneLine,
  type Scope,
} from '../expression/index.ts';
import { type Problem, problem } from '../problem/index.ts';
import { MOST_PROBLEMS } from './limits.ts';
import { quantityFields } from './quantities.ts';
import { pathOf, type SheetPlace, TOP_SHEET } from './reading/index.ts';
import { blockTitleAtStart } from './titles.ts';
import type { Block, Diagram, Sheet } from './types.ts';

/**
 * The problems of all expressions in document order, parameters first, at most a hundred; empty where all have values. Where
 * a parameter is at fault the blocks are not asked, as they could not be evaluated.
 */
export function checkExpressions(diagram: Diagram): readonly Problem[] {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) return parameters.problems.slice(0, MOST_PROBLEMS);
  const problems = [...toleranceProblems(diagram, parameters.value)];
  checkSheet(diagram, TOP_SHEET, parameters.value, problems);
  return problems.slice(0, MOST_PROBLEMS);
}

function toleranceProblems({ parameters }: Diagram, scope: Scope): readonly Problem[] {
  return parameters.flatMap(({ name, tolerance }) => {
    const nominal = scope.get(name);
    if (tolerance === undefined || nominal === undefined) return [];
    const amount = evaluateTolerance(tolerance, nominal, scope);
    if (amount.ok) return [];
    const title = `Parameter ${onOneLine(name)}, tolerance`;
    return amount.problems.map(({ code, message }) => problem(code, `${title}: ${message}`, { parameter: name }));
  });
}

/** Recursion is as deep as groups are: at most 32. */
function checkSheet(sheet: Sheet, place: SheetPlace, scope: Scope, problems: Problem[]): void {
  for (const block of sheet.blocks) {
    if (problems.length >= MOST_PROBLEMS) return;
    if (block.kind === 'group') {
      const names = [...place.names, block.name ?? block.id];
      checkSheet(block.sheet, { ids: [...place.ids, block.id], names }, scope, problems);
    } else problems.push(...blockProblems(block, place, scope));
  }
}

function blockProblems(block: Block, place: SheetPlace, scope: Scope): readonly Problem[] {
  const fields = quantityFields(block);
  return fields.flatMap(({ field, text, isPolynomial }) => {
    const result = isPolynomial ? evaluatePolynomial(text, scope) : evaluateQuantity(text, scope);
    if (result.ok) return [];
    const named = { ...block, name: [...place.names, block.name ?? block.id].join('.') };
    const title = blockTitleAtStart(named) + (fields.length > 1 ? `, ${field}` : '');
    const blocks = [pathOf(place, block.id)];
    return result.problems.map(({ code, message }) => problem(code, `${title}: ${message}`, { blocks }));
  });
}
