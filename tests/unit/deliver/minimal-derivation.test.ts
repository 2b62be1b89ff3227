import { describe, expect, test } from 'vitest';
import { compile } from '../../../src/compile/index.ts';
import { FORMATS, minimalDerivation, modelFile } from '../../../src/deliver/index.ts';
import type { Block, Diagram } from '../../../src/diagram/index.ts';
import { problemsOf, valueOf } from '../results.ts';

/** u → plant → y. */
function around(plant: Block, more: readonly Block[] = []): Diagram {
  return {
    format: 'poleward-diagram',
    version: 1,
    title: 'cancelled',
    parameters: [],
    blocks: [{ id: 'u', kind: 'input' }, plant, { id: 'y', kind: 'output' }, ...more],
    wires: [
      { from: ['u', 0], to: [plant.id, 0] },
      { from: [plant.id, 0], to: ['y', 0] },
    ],
  };
}

const cancelled = around({ id: 'P', kind: 'transfer-function', numerator: 's + 1', denominator: '(s + 1)*(s + 2)' });
const derivedFrom = (diagram: Diagram) => ({ diagram, derivation: valueOf(compile(diagram)) });

describe('the minimal model in a file', () => {
  // (s + 1)/((s + 1)(s + 2)) = 1/(s + 2).
  test('has the cancelled pole left out and says what its state is', () => {
    const file = modelFile(valueOf(minimalDerivation(derivedFrom(cancelled))));
    expect(file).toMatchObject({
      states: ['z_1'],
      A: [[-2]],
      exact: { A: [['-2']], B: [['1']], C: [['1']], D: [['0']] },
      symbolic: null,
      poles: [{ re: -2, im: 0, multiplicity: 1 }],
      transferFunctions: [{ input: 'u', output: 'y', numerator: [1], denominator: [1, 2] }],
      controllable: true,
      observable: true,
      warnings: [],
      minimal: { of: ['P_1', 'P_2'], change: [['1', '1']] },
    });
  });

  test('is written in every format of the model', () => {
    const derived = valueOf(minimalDerivation(derivedFrom(cancelled)));
    for (const format of FORMATS) {
      if (format.scope === 'model') expect(format.write({ ...derived, notation: 'symbols' }).length).toBeGreaterThan(0);
    }
    const csv = FORMATS.find(({ id }) => id === 'csv');
    expect(csv?.scope === 'model' ? csv.write({ ...derived, notation: 'fractions' }) : '').toContain('z_1');
  });

  test('is the drawing’s own, formulas and all, where that is minimal', () => {
    const plain = around({ id: 'P', kind: 'transfer-function', numerator: '1', denominator: 's + 2' });
    const file = modelFile(valueOf(minimalDerivation(derivedFrom(plain))));
    expect(file.states).toEqual(['P_1']);
    expect(file.symbolic).not.toBeNull();
    expect(file.minimal).toEqual({ of: ['P_1'], change: [['1']] });
  });

  test('warns where the initial state holds what no input reaches', () => {
    const aside = around({ id: 'P', kind: 'integrator' }, [{ id: 'x', kind: 'integrator', initial: '3' }]);
    const file = modelFile(valueOf(minimalDerivation(derivedFrom(aside))));
    expect(file.states).toEqual(['P']);
    expect(file.warnings.filter(({ code }) => code === 'initial-state-lost')).toEqual([
      {
        code: 'initial-state-lost',
        blocks: [],
        message:
          'The initial state holds something that no input reaches, which the minimal model has no state for: its answer to the initial state is another one.',
      },
    ]);
  });

  test('is refused for more states than exact answers allow', () => {
    const many = Array.from({ length: 129 }, (_, i): Block => ({ id: `x${i}`, kind: 'integrator' }));
    const diagram = around({ id: 'P', kind: 'gain', gain: '1' }, many);
    expect(problemsOf(minimalDerivation(derivedFrom(diagram)))).toEqual([
      'not-supported: The model has 129 states, too many to find a minimal one exactly. Export the whole model.',
    ]);
  });
});
