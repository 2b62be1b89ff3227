/** `--set NAME=EXPR`: the drawing with parameters of other values. */

import type { Diagram } from '../diagram/index.ts';
import { nearestName, parseExpression } from '../expression/index.ts';
import { fail, ok, type Problem, problem, type Result } from '../problem/index.ts';
import type { Setting } from './request.ts';

/**
 * The drawing with the values set, the last one of a name holding.
 *
 * @returns `unknown-parameter` for each name that the drawing has no parameter of, and what is wrong with each expression.
 */
export function withSettings(diagram: Diagram, settings: readonly Setting[]): Result<Diagram> {
  if (settings.length === 0) return ok(diagram);
  const [first, ...others] = settings.flatMap(setting => problemsOf(setting, diagram));
  if (first !== undefined) return fail(first, ...others);
  const values = new Map(settings.map(({ name, value }) => [name, value]));
  const parameters = diagram.parameters.map(parameter => {
    const value = values.get(parameter.name);
    return value === undefined ? parameter : { ...parameter, value };
  });
  return ok({ ...diagram, parameters });
}

function problemsOf({ name, value }: Setting, { parameters }: Diagram): readonly Problem[] {
  const names = parameters.map(parameter => parameter.name);
  if (!names.includes(name)) {
    const nearest = nearestName(name, names);
    const way = nearest === null ? listOf(names) : `Did you mean ${nearest}?`;
    return [problem('unknown-parameter', `The drawing has no parameter ${name}. ${way}`, { parameter: name })];
  }
  const parsed = parseExpression(value);
  if (parsed.ok) return [];
  return parsed.problems.map(each => ({ ...each, parameter: name, message: `Parameter ${name}: ${each.message}` }));
}

function listOf(names: readonly string[]): string {
  return names.length === 0 ? 'It has none at all.' : `It has ${names.join(', ')}.`;
}
