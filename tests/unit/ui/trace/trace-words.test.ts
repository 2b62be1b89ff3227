import { describe, expect, test } from 'vitest';
import { compile } from '../../../../src/compile/index.ts';
import { type Trace, traceable, traceEntry } from '../../../../src/compile/trace/index.ts';
import { startingDrawing } from '../../../../src/diagram/index.ts';
import { marksOf } from '../../../../src/ui/trace/trace-marks.ts';
import { numberText, spokenPart, spokenTrace } from '../../../../src/ui/trace/trace-words.ts';

/** Of the winch: states omega, F, q, T; inputs r, v; output F. */
function winchTrace(row: number, column: number): Trace {
  const diagram = startingDrawing();
  const derived = compile(diagram);
  const traced = derived.ok ? traceable(diagram, derived.value.model) : derived;
  if (!traced.ok) throw new Error(traced.problems[0]?.message);
  return traceEntry(traced.value, { row, column });
}

describe('a trace as a sentence', () => {
  test('says entry, value and way', () => {
    expect(spokenTrace(winchTrace(0, 3))).toBe(
      'the derivative of omega from T: 1/J = 5/4, one path: T, then summing point, then 1/J, then integrator omega.',
    );
  });

  test('says where no path leads', () => {
    expect(spokenTrace(winchTrace(0, 4))).toBe('the derivative of omega from input r: 0, no path leads there.');
  });

  test('goes to an output by its block', () => {
    expect(spokenTrace(winchTrace(4, 1))).toBe('output F from F: 1, one path: F, then output F.');
  });

  test('says why an entry is not traced', () => {
    const trace: Trace = { ...winchTrace(0, 3), outcome: 'not-traced', reason: 'Too many.' };
    expect(spokenTrace(trace)).toBe('the derivative of omega from T: Too many.');
  });
});

describe('a traced number', () => {
  const value = (n: bigint, d: bigint) => ({ exact: { n, d }, symbols: null });

  test('is a fraction, a decimal where that is asked for or the fraction is too long, marked where it is rounded', () => {
    expect(numberText(value(5n, 4n))).toBe('5/4');
    expect(numberText(value(5n, 4n), true)).toBe('1.25');
    expect(numberText(value(-1n, 3n), true)).toBe('≈ −0.333333');
    expect(numberText(value(10n ** 40n + 1n, 3n))).toMatch(/^≈ /);
  });
});

describe('a part as a sentence', () => {
  const model = (() => {
    const derived = compile(startingDrawing());
    if (!derived.ok) throw new Error('no model');
    return derived.value.model;
  })();

  test('lists its entries, of more than twelve the number', () => {
    expect(spokenPart('Gain k', model, [{ row: 4, column: 1 }])).toBe('Gain k takes part in 1 entry: output F from F.');
    expect(spokenPart('Gain k', model, [])).toBe('Gain k takes part in no entries.');
    const many = Array.from({ length: 14 }, () => ({ row: 0, column: 0 }));
    expect(spokenPart('Gain k', model, many)).toMatch(
      /^Gain k takes part in 14 entries: the derivative of omega from omega, .* and 2 more\.$/,
    );
  });
});

describe('the marks of a trace', () => {
  test('are the blocks and wires of its path, the ends told apart', () => {
    const { blocks, wires } = marksOf(winchTrace(0, 3));
    expect([...blocks].sort()).toEqual([
      ['T', 'end'],
      ['drum', 'path'],
      ['omega', 'end'],
      ['torque', 'path'],
    ]);
    expect([...wires].sort()).toEqual([
      ['drum:0', 'path'],
      ['omega:0', 'path'],
      ['torque:0', 'path'],
    ]);
  });

  test('are the row’s and the column’s block alone where no path leads', () => {
    const { blocks, wires } = marksOf(winchTrace(0, 4));
    expect([[...blocks], [...wires]]).toEqual([
      [
        ['r', 'end'],
        ['omega', 'end'],
      ],
      [],
    ]);
  });
});
