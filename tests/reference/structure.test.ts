/** Published and hand-worked drawings with their minimal models and hidden modes. */

import { describe, expect, test } from 'vitest';
import { toFraction } from '../../src/algebra/index.ts';
import { allTransferFunctions, poles } from '../../src/analysis/index.ts';
import { minimalModel, structureReport } from '../../src/analysis/minimal/index.ts';
import { compile, type StateSpace } from '../../src/compile/index.ts';
import { isWithin, readSituations, type Situation } from './read-cases.ts';

function modelOf({ diagram }: Situation): StateSpace {
  const result = compile(diagram);
  if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join(' '));
  return result.value.model;
}

function minimalOf(model: StateSpace) {
  const found = minimalModel(model);
  if (found === null) throw new Error('too many states');
  return found;
}

const withTransferFunctions = readSituations().filter(
  ({ expect: { transferFunctions } }) => transferFunctions !== undefined,
);

test.each(withTransferFunctions)('$name: its minimal model has its transfer functions', situation => {
  const found = allTransferFunctions(minimalOf(modelOf(situation)).model);
  for (const each of situation.expect.transferFunctions ?? []) {
    const fraction = found.find(({ input, output }) => input === each.input && output === each.output);
    if (fraction?.route !== 'certified') throw new Error(`${each.output} from ${each.input} was not computed`);
    const tolerance = situation.tolerance('transferFunctions');
    for (const part of ['numerator', 'denominator'] as const) {
      expect(fraction[part]).toHaveLength(each[part].length);
      for (const [i, value] of each[part].entries()) {
        expect(isWithin(fraction[part][i] ?? NaN, value, tolerance), `${part} ${i}`).toBe(true);
      }
    }
  }
});

const structured = readSituations().filter(({ expect: { controllable, observable } }) => {
  return controllable !== undefined && observable !== undefined;
});

test.each(structured)('$name: its model is minimal exactly where it is controllable and observable', situation => {
  const model = modelOf(situation);
  const isMinimal = minimalOf(model).model.states.length === model.states.length;
  expect(isMinimal).toBe(situation.expect.controllable === true && situation.expect.observable === true);
});

describe('the four parts of Kalman 1963 (SIAM J. Control 1)', () => {
  const [situation] = readSituations().filter(({ name }) => name === 'kalman-four-part-decomposition');
  if (situation === undefined) throw new Error('the case is gone');
  const model = modelOf(situation);

  // G(s) = 1/(s + 2): of the four modes the tube's alone is both reached and shown.
  test('leave the tube’s lag as the minimal model', () => {
    const { model: minimal, change, losesInitialState } = minimalOf(model);
    expect(minimal.states.map(({ name }) => name)).toEqual(['tube']);
    expect([minimal.numeric.A, minimal.numeric.B, minimal.numeric.C].map(({ values }) => Array.from(values))).toEqual([
      [-2],
      [1],
      [1],
    ]);
    expect(change.map(row => row.map(toFraction))).toEqual([['0', '1', '0', '0']]);
    expect(losesInitialState).toBe(true); // the ambient begins at 1 and no input reaches it
  });

  // A is triangular: a right eigenvector of −1 is (1, 0, 0, 0); what no input reaches lies in jacket and ambient.
  test('hide −1 behind the outputs, −4 from the inputs and −3 from both', () => {
    const report = structureReport(model);
    expect(report).toMatchObject({ states: 4, reached: 2, seen: 2, minimal: 1 });
    expect(
      report?.modes?.map(({ re, isUncontrollable, isUnobservable }) => [re, isUncontrollable, isUnobservable]),
    ).toEqual([
      [-1, false, true],
      [-3, true, true],
      [-4, true, false],
    ]);
    expect(report?.modes?.[0]?.states).toEqual([0]);
    expect(report?.contributions.map(({ role }) => role)).toEqual(['unseen', 'kept', 'unreached', 'unreached']);
    expect(poles(minimalOf(model).model).poles.map(({ re }) => re)).toEqual([-2]);
  });
});
