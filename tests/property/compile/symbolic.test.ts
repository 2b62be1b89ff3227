import fc from 'fast-check';
import { expect, test } from 'vitest';
import { parseRational, type Rational, rationalField, toRows, ZERO } from '../../../src/algebra/index.ts';
import { createSymbolicField, evaluateAt } from '../../../src/algebra/symbolic/index.ts';
import { compile, deriveSymbolic } from '../../../src/compile/index.ts';
import type { Diagram } from '../../../src/diagram/index.ts';
import { randomDrawings } from '../../arbitraries/random-drawings.ts';
import { SEED } from '../../arbitraries/rationals.ts';

const MATRICES = ['A', 'B', 'C', 'D'] as const;

/** Written as a parameter's value; b = -1 is left out, where 1/(1 + b) has none. */
const values = fc.constantFrom('2', '-3', '5/7', '-11/13', '1/2', '17', '0.01', '-29/3');

/** Drawings whose two parameters have random values. */
const drawings = (differentiates: boolean): fc.Arbitrary<Diagram> =>
  fc.tuple(randomDrawings({ blocks: 9, depth: 2, differentiates }), values, values).map(([diagram, a, b]) => ({
    ...diagram,
    parameters: [
      { name: 'a', value: a },
      { name: 'b', value: b },
    ],
  }));

function valueOf(diagram: Diagram, name: string): Rational {
  const value = parseRational(diagram.parameters.find(parameter => parameter.name === name)?.value ?? '');
  if (value === null) throw new Error(`${name} has no value`);
  return value;
}

/** Compares both ways for many drawings and returns for how many there was something to compare. */
function compared(differentiates: boolean, numRuns: number): number {
  const { zero } = createSymbolicField();
  let count = 0;
  fc.assert(
    fc.property(drawings(differentiates), diagram => {
      const numeric = compile(diagram, { field: 'rational' });
      const symbolic = deriveSymbolic(diagram);
      if (!numeric.ok || !symbolic.ok || !symbolic.value.finished) return;
      const { rational, states } = numeric.value.model;
      const general = symbolic.value.value;
      if (rational === null || general.vanishing.length > 0) return;
      if (general.states.map(({ name }) => name).join() !== states.map(({ name }) => name).join()) return;
      count += 1;
      for (const key of MATRICES) {
        const at = toRows(general.matrices[key], zero).map(row =>
          row.map(f => evaluateAt(f, rationalField, name => valueOf(diagram, name))),
        );
        expect(at).toEqual(toRows(rational[key], ZERO));
      }
    }),
    { seed: SEED, numRuns },
  );
  return count;
}

test('symbolic matrices at random values of the parameters are the numeric matrices, to the last digit', () => {
  expect(compared(false, 200)).toBeGreaterThan(100);
});

test('the same holds where drawings differentiate', () => {
  expect(compared(true, 200)).toBeGreaterThan(50);
});
