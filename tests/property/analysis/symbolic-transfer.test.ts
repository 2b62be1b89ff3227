/**
 * The transfer function in symbols, its parameters and s put in, is what the drawing's raw equations give at that s: a route that shares
 * neither the elimination nor the state-space model.
 */

import { expect, test } from 'vitest';
import { doubleField } from '../../../src/algebra/index.ts';
import { evaluateAt } from '../../../src/algebra/symbolic/index.ts';
import { symbolicTransfer } from '../../../src/analysis/index.ts';
import { deriveSymbolic, directResponse } from '../../../src/compile/index.ts';
import { startingDrawing, workedDrawings } from '../../../src/diagram/index.ts';
import { evaluateParameters, evaluateQuantity } from '../../../src/expression/index.ts';

const ONE = { variables: [], exponents: [], coefficients: [1n] };

/** Without dead time, of which the model holds an approximation and the raw equations the true one. */
const DRAWINGS = [startingDrawing(), ...workedDrawings().map(({ diagram }) => diagram)]
  .filter(({ blocks }) => !blocks.some(({ kind }) => kind === 'delay'))
  .map(diagram => [diagram.title, diagram] as const);

test.each(DRAWINGS)('of every channel of %s', (_, diagram) => {
  const derived = deriveSymbolic(diagram);
  const scope = evaluateParameters(diagram.parameters);
  const direct = directResponse(diagram);
  if (!derived.ok || !derived.value.finished || !scope.ok || !direct.ok) throw new Error('no symbolic model');
  const model = derived.value.value;
  const at = (name: string) => {
    const value = evaluateQuantity(name, scope.value);
    return value.ok ? value.value.double : Number.NaN;
  };
  let compared = 0;
  for (let output = 0; output < model.outputs.length; output++) {
    for (let input = 0; input < model.inputs.length; input++) {
      const found = symbolicTransfer(model, { input, output });
      if (!found.finished) throw new Error('the effort was spent');
      for (const s of [0.7, 3.1, 11]) {
        const horner = (coefficients: typeof found.value.numerator) =>
          coefficients.reduce(
            (sum, c) => sum * s + (evaluateAt({ numerator: c, denominator: ONE }, doubleField, at) ?? 0),
            0,
          );
        const expected = direct.value.at({ re: s, im: 0 }, input)?.[output];
        const value = horner(found.value.numerator) / horner(found.value.denominator);
        expect(Math.abs(value - (expected?.re ?? Number.NaN))).toBeLessThan(1e-9 * Math.max(1, Math.abs(value)));
        compared += 1;
      }
    }
  }
  expect(compared).toBeGreaterThan(0);
});
