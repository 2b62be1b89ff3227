/** Names that the outside world tells signals apart by: unique among states, among inputs and among outputs. */

import { type Problem, problem } from '../problem/index.ts';
import type { SignalName } from './state-space.ts';

/** A `duplicate-name` for each name that stands twice among its like; an output may bear the name of a state. */
export function nameProblems(named: {
  readonly states: readonly SignalName[];
  readonly inputs: readonly SignalName[];
  readonly outputs: readonly SignalName[];
}): Problem[] {
  return [
    ...duplicates('states', named.states),
    ...duplicates('inputs', named.inputs),
    ...duplicates('outputs', named.outputs),
  ];
}

function duplicates(what: string, signals: readonly SignalName[]): Problem[] {
  const first = new Map<string, SignalName>();
  const problems: Problem[] = [];
  for (const signal of signals) {
    const before = first.get(signal.name);
    if (before === undefined) first.set(signal.name, signal);
    else {
      const message = `Two ${what} are called ${signal.name}. Give one of their blocks another name.`;
      problems.push(problem('duplicate-name', message, { blocks: [...new Set([before.block, signal.block])] }));
    }
  }
  return problems;
}
