/**
 * The parameters of a drawing, each in terms of the others in any order. They are evaluated along their dependencies without
 * recursion, so that a chain of thousands is as safe as one.
 */

import { type Problem, problem, type Result } from '../problem/index.ts';
import { evaluateExpression, type Scope, unknownNames } from './evaluate.ts';
import type { Expression, Value } from './expression.ts';
import { namesIn } from './names.ts';
import { parseExpression } from './parse.ts';
import { word } from './wording.ts';

/** What is needed of a parameter. */
export interface ParameterText {
  readonly name: string;
  readonly value: string;
}

interface Definition {
  readonly name: string;
  readonly expression: Expression;
  /** Those that it uses and that are parameters. */
  readonly uses: readonly string[];
}

/**
 * The values of all parameters by name, in the order given; names are legal and differ. Every parameter that is at fault is
 * reported, in that order: text that is no expression, names that are no parameters, cycles (once each, naming all their
 * members), division by zero. One that only uses another at fault is not. A value may be infinite or NaN: that is a
 * problem of the block that uses it.
 */
export function evaluateParameters(parameters: readonly ParameterText[]): Result<ReadonlyMap<string, Value>> {
  const names = new Map(parameters.map(({ name }) => [name, true]));
  const problems = new Map<string, Problem[]>();
  const definitions = new Map<string, Definition>();
  for (const { name, value } of parameters) {
    const parsed = parseExpression(value);
    const unknown = parsed.ok ? unknownNames(parsed.value, names) : parsed;
    if (unknown !== null && !unknown.ok) problems.set(name, concerning(name, unknown.problems));
    if (parsed.ok && unknown === null) {
      definitions.set(name, { name, expression: parsed.value, uses: namesIn(parsed.value) });
    }
  }
  const order = evaluationOrder(definitions);
  for (const cycle of order.cycles) {
    const [first] = cycle;
    if (first !== undefined) problems.set(first, [...(problems.get(first) ?? []), cyclic(first, cycle)]);
  }
  const values = evaluateInOrder(order.sorted, problems);
  const all = parameters.flatMap(({ name }) => problems.get(name) ?? []);
  if (all.length > 0) return { ok: false, problems: all };
  return { ok: true, value: inDocumentOrder(parameters, values) };
}

/** Puts the parameter's name in front. */
function concerning(name: string, problems: readonly Problem[]): Problem[] {
  return problems.map(({ code, message }) => problem(code, `Parameter ${word(name)}: ${message}`, { parameter: name }));
}

function cyclic(name: string, cycle: readonly string[]): Problem {
  const way = [...(cycle.length > LONGEST_WAY ? [...cycle.slice(0, LONGEST_WAY - 1), '…'] : cycle), name]
    .map(word)
    .join(' → ');
  const message =
    cycle.length === 1
      ? `Parameter ${word(name)}: its value uses ${word(name)} itself. Give it a value of its own.`
      : `Parameter ${word(name)}: its value leads back to itself, ${way}. Give one of them a value of its own.`;
  return problem('cyclic-parameters', message, { parameter: name });
}

/** Members of a cycle that a message lists. */
const LONGEST_WAY = 12;

function evaluateInOrder(sorted: readonly Definition[], problems: Map<string, Problem[]>): Scope {
  const values = new Map<string, Value>();
  for (const { name, expression, uses } of sorted) {
    if (!uses.every(used => values.has(used))) continue; // one that it uses is at fault and reported
    const result = evaluateExpression(expression, values);
    if (result.ok) values.set(name, result.value);
    else problems.set(name, concerning(name, result.problems));
  }
  return values;
}

function inDocumentOrder(parameters: readonly ParameterText[], values: Scope): Scope {
  const ordered = new Map<string, Value>();
  for (const { name } of parameters) {
    const value = values.get(name);
    if (value !== undefined) ordered.set(name, value);
  }
  return ordered;
}

interface Order {
  /** Each after those that it uses; the members of cycles and what uses them have no such place and stand anywhere. */
  readonly sorted: readonly Definition[];
  /** Each from its first member in the order given, every one using the next; at most `MOST_CYCLES`. */
  readonly cycles: readonly (readonly string[])[];
}

/** Cycles that are reported; more would be no help, and a tangle can hold a great many. */
const MOST_CYCLES = 20;

interface Step {
  readonly definition: Definition;
  /** How many of its uses have been followed. */
  followed: number;
}

/** Depth first along the uses with a stack of its own. Linear in the uses. */
function evaluationOrder(definitions: ReadonlyMap<string, Definition>): Order {
  const places = new Map([...definitions.keys()].map((name, place) => [name, place]));
  const sorted: Definition[] = [];
  const cycles: (readonly string[])[] = [];
  const state = new Map<string, 'open' | 'done'>();
  for (const start of definitions.values()) {
    const path: Step[] = state.has(start.name) ? [] : [{ definition: start, followed: 0 }];
    for (let top = path.at(-1); top !== undefined; top = path.at(-1)) {
      const { definition } = top;
      state.set(definition.name, 'open');
      const used = definition.uses[top.followed];
      top.followed += 1;
      if (used === undefined) {
        state.set(definition.name, 'done');
        sorted.push(definition);
        path.pop();
        continue;
      }
      const next = definitions.get(used);
      if (next !== undefined && !state.has(used)) path.push({ definition: next, followed: 0 });
      if (state.get(used) === 'open' && cycles.length < MOST_CYCLES) cycles.push(cycleBackTo(used, path, places));
    }
  }
  return { sorted, cycles };
}

/** The members from `name` to the end of the path, turned so that the first in the order given comes first. */
function cycleBackTo(name: string, path: readonly Step[], places: ReadonlyMap<string, number>): string[] {
  const names = path.map(({ definition }) => definition.name);
  const members = names.slice(names.indexOf(name));
  const place = (member: string) => places.get(member) ?? 0;
  const first = members.reduce((least, member) => (place(member) < place(least) ? member : least));
  const turn = members.indexOf(first);
  return [...members.slice(turn), ...members.slice(0, turn)];
}
