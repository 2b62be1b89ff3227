/** Published and hand-worked drawings with their state-space models: names, matrices, refusals and warnings. */

import { describe, expect, test } from 'vitest';
import { type Rational, toFraction, toRows, ZERO } from '../../src/algebra/index.ts';
import { createSymbolicField } from '../../src/algebra/symbolic/index.ts';
import { compile, type Derivation, deriveSymbolic } from '../../src/compile/index.ts';
import { evaluateIn, parseExpression } from '../../src/expression/index.ts';
import { EXIT_STATUS } from '../../src/problem/index.ts';
import { isWithin, readSituations, type Situation, situationsWith } from './read-cases.ts';

const MATRICES = ['A', 'B', 'C', 'D'] as const;

function derivationOf({ diagram }: Situation, field: 'rational' | 'double' = 'rational'): Derivation {
  const result = compile(diagram, { field });
  if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join(' '));
  return result.value;
}

const derivable = readSituations().filter(({ expect: expected }) => expected.error === undefined);
const names = (signals: readonly { readonly name: string }[]) => signals.map(({ name }) => name);

describe.each(derivable)('$name', situation => {
  const { expect: expected, tolerance } = situation;

  test('its signals have their names in document order', () => {
    const { model } = derivationOf(situation);
    if (expected.states !== undefined) expect(names(model.states)).toEqual(expected.states);
    if (expected.inputs !== undefined) expect(names(model.inputs)).toEqual(expected.inputs);
    if (expected.outputs !== undefined) expect(names(model.outputs)).toEqual(expected.outputs);
    expect(model.states).toHaveLength(expected.states?.length ?? expected.stateCount ?? model.states.length);
    expect(model.initialState).toEqual(expected.initialState ?? model.states.map(() => 0));
  });

  test.each(['rational', 'double'] as const)('its matrices are the published ones in the %s field', field => {
    const { numeric } = derivationOf(situation, field).model;
    for (const key of MATRICES) {
      const wanted = expected[key];
      if (wanted === undefined) continue;
      const rows = toRows(numeric[key], 0);
      expect(rows.map(row => row.length)).toEqual(wanted.map(row => row.length));
      const isNear = wanted.map((row, i) =>
        row.map((value, j) => isWithin(rows[i]?.[j] ?? NaN, value, tolerance(key))),
      );
      expect(isNear, `${key} = ${JSON.stringify(rows)}`).toEqual(wanted.map(row => row.map(() => true)));
    }
  });

  test('the self-check agrees', () => {
    expect(derivationOf(situation).selfCheck).toMatchObject({ passed: true, frequencies: 3 });
    expect(derivationOf(situation, 'double').selfCheck).toMatchObject({ passed: true, frequencies: 3 });
  });
});

test.each(situationsWith('exact'))('$name: the exact matrices are the fractions of the source', situation => {
  const { model } = derivationOf(situation);
  const wanted = situation.expect.exact;
  if (wanted === null || wanted === undefined) {
    expect(model.irrational).not.toEqual([]);
    return;
  }
  expect(model.irrational).toEqual([]);
  for (const key of MATRICES) {
    const rows = model.rational === null ? null : toRows<Rational>(model.rational[key], ZERO);
    expect(rows?.map(row => row.map(toFraction))).toEqual(wanted[key]);
  }
});

test.each(situationsWith('symbolic'))('$name: the symbolic matrices are the formulas of the source', situation => {
  const field = createSymbolicField();
  const wanted = situation.expect.symbolic;
  const derived = deriveSymbolic(situation.diagram);
  if (wanted === undefined || !derived.ok || !derived.value.finished) throw new Error('no symbolic model');
  const { matrices } = derived.value.value;
  for (const key of MATRICES) {
    const rows = toRows(matrices[key], field.zero);
    const isEqual = wanted[key].map((row, i) =>
      row.map((text, j) => {
        const parsed = parseExpression(text);
        const formula = parsed.ok ? evaluateIn(parsed.value, field, name => field.variable(name)) : null;
        const entry = rows[i]?.[j];
        return formula !== null && entry !== undefined && field.equals(entry, formula);
      }),
    );
    expect(isEqual, key).toEqual(wanted[key].map(row => row.map(() => true)));
  }
});

test.each(situationsWith('irrationalParameters'))('$name: its irrational parameters are named', situation => {
  const { model, warnings } = derivationOf(situation);
  const named = model.irrational.map(text => text.split(' = ')[0]);
  expect(named).toEqual(situation.expect.irrationalParameters);
  expect(warnings.filter(({ code }) => code === 'irrational-value')).toHaveLength(named.length);
});

test.each(situationsWith('warnings'))('$name: exactly the expected warnings are given', situation => {
  const given = derivationOf(situation).warnings.map(({ code, blocks }) => ({ code, blocks }));
  expect(given).toHaveLength(situation.expect.warnings?.length ?? 0);
  expect(given).toEqual(expect.arrayContaining([...(situation.expect.warnings ?? [])]));
});

test.each(situationsWith('error'))(
  '$name: the drawing is refused in words that name its blocks',
  ({ diagram, expect: expected }) => {
    const error = expected.error;
    for (const field of ['rational', 'double'] as const) {
      const result = compile(diagram, { field });
      const problems = result.ok ? [] : result.problems;
      expect(problems).toHaveLength(1);
      const [problem] = problems;
      if (problem === undefined || error === undefined) continue;
      expect(EXIT_STATUS[problem.code]).toBe(error.exitStatus);
      for (const word of error.words) expect(problem.message).toContain(word);
      expect(error.blocks.some(block => problem.blocks.includes(block))).toBe(true);
      expect(problem.code).toBe(error.kind === 'improper' ? 'derivative-of-input' : 'loop-without-solution');
      if (error.input !== undefined) expect(problem.message).toContain(error.input);
      if (error.output !== undefined) expect(problem.message).toContain(error.output);
    }
  },
);
