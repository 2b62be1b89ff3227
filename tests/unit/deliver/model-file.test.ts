/** The model file, key by key, against the reference case of the motor and against what the format says. */

import { describe, expect, test } from 'vitest';
import { modelFile, modelWarnings } from '../../../src/deliver/index.ts';
import { emptyDiagram } from '../../../src/diagram/index.ts';
import motor from '../../reference/cases/dc-motor-symbolic.json';
import { derivationOf, EMPTY, type HandModel, MOTOR, STATIC } from './derivations.ts';
import { textIn } from './written.ts';

const KEYS = [
  'format',
  'version',
  'title',
  'time',
  'states',
  'inputs',
  'outputs',
  'A',
  'B',
  'C',
  'D',
  'initialState',
  'exact',
  'symbolic',
  'poles',
  'zeros',
  'transferFunctions',
  'stability',
  'controllable',
  'observable',
  'shiftedStates',
  'warnings',
  'selfCheck',
];

/** One lag a state, all driven by one input: `n` poles at −1, −2, … */
function lags(n: number): HandModel {
  const indices = Array.from({ length: n }, (_, i) => i);
  return {
    states: indices.map(i => `x${i}`),
    inputs: ['u'],
    outputs: ['y'],
    A: indices.map(i => indices.map(j => (i === j ? `${-1 - i}` : '0'))),
    B: indices.map(() => ['1']),
    C: [indices.map(() => '1')],
    D: [['0']],
  };
}

/** The drawing of a derivation by hand is an empty sheet: only the symbolic entries ask for it. */
const fileOf = (model: HandModel) => modelFile({ diagram: emptyDiagram(), derivation: derivationOf(model) });

describe('the model file', () => {
  test('has the keys of the format in its order', () => {
    expect(Object.keys(JSON.parse(textIn('model', derivationOf(MOTOR))))).toEqual(KEYS);
  });

  test('says of the motor what the reference case says', () => {
    const file = fileOf(MOTOR);
    const { states, inputs, outputs, A, B, C, D, exact, stability, controllable, observable } = motor.expect;
    expect(file).toMatchObject({ states, inputs, outputs, A, B, C, D, exact, stability, controllable, observable });
    expect(file.initialState).toEqual([0, 12.5, 0]);
    expect(file.poles?.map(({ multiplicity }) => multiplicity)).toEqual([1, 1, 1]);
    file.poles?.forEach((pole, i) => {
      expect(pole.re).toBeCloseTo(motor.expect.poles[i]?.re ?? Number.NaN, 9);
    });
  });

  test('has a transfer function for each output and input, as the reference case orders and reduces them', () => {
    const found = fileOf(MOTOR).transferFunctions ?? [];
    expect(found).toHaveLength(motor.expect.transferFunctions.length);
    found.forEach((entry, i) => {
      const { input, output, numerator, denominator } = Object(motor.expect.transferFunctions[i]);
      expect([entry.input, entry.output]).toEqual([input, output]);
      expect(entry.numerator).toEqual(numerator);
      expect(entry.denominator).toEqual(denominator);
    });
  });

  test('has no exact entries where a quantity is irrational', () => {
    const file = fileOf({ ...STATIC, irrational: ['k = sqrt(2)'] });
    expect(file.exact).toBeNull();
    expect(file.D).toEqual([[0.3125]]);
  });

  test('has empty matrices for an empty sheet, controllable and observable', () => {
    expect(fileOf(EMPTY)).toMatchObject({
      A: [],
      B: [],
      C: [],
      D: [],
      exact: { A: [], B: [], C: [], D: [] },
      poles: [],
      zeros: [],
      transferFunctions: [],
      stability: 'stable',
      controllable: true,
      observable: true,
    });
  });

  test('says null of what is not computed for so many states, and still has the poles', () => {
    const file = fileOf(lags(129));
    const { zeros, transferFunctions, controllable, observable } = file;
    expect({ zeros, transferFunctions, controllable, observable }).toEqual({
      zeros: null,
      transferFunctions: null,
      controllable: null,
      observable: null,
    });
    expect(file.poles?.map(({ re }) => Math.round(re))).toEqual(Array.from({ length: 129 }, (_, i) => -1 - i));
    expect(file.stability).toBe('stable');
  });

  test('is the same text each time, a row of a matrix a line', () => {
    const text = textIn('model', derivationOf(MOTOR));
    expect(text).toBe(textIn('model', derivationOf(MOTOR)));
    expect(text).toContain('"A": [[-400, -16.666666666666668, 0], [200, -0.4, 0], [0, 1, 0]],');
  });

  test('keeps the warnings of the derivation and adds the poles that no transfer function shows', () => {
    const open = { code: 'port-not-connected', blocks: ['sum'], message: 'Open.' } as const;
    // The input does not reach the first state, so its pole −1 cancels.
    const hidden: HandModel = { ...lags(2), B: [['0'], ['1']] };
    const derivation = { ...derivationOf(hidden), warnings: [open] };
    expect(modelFile({ diagram: emptyDiagram(), derivation }).warnings).toEqual(modelWarnings(derivation));
    expect(modelWarnings(derivation).map(({ code, blocks }) => ({ code, blocks }))).toEqual([
      { code: 'port-not-connected', blocks: ['sum'] },
      { code: 'hidden-mode', blocks: ['x0'] },
    ]);
  });
});
