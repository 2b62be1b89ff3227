/** Entries in the parameters: against the formulas of the reference case, and what is said where there are none. */

import { describe, expect, test } from 'vitest';
import { compile, type Derivation } from '../../../src/compile/index.ts';
import { modelFile } from '../../../src/deliver/index.ts';
import { type Diagram, readDiagram } from '../../../src/diagram/index.ts';
import { evaluateParameters, evaluateQuantity } from '../../../src/expression/index.ts';
import motor from '../../reference/cases/dc-motor-symbolic.json';
import { textIn } from './written.ts';

function derived(diagram: object): { diagram: Diagram; derivation: Derivation } {
  const read = readDiagram(JSON.stringify(diagram));
  const derivation = read.ok ? compile(read.value) : read;
  if (!read.ok || !derivation.ok) throw new Error('the drawing of the test has a model');
  return { diagram: read.value, derivation: derivation.value };
}

/** Two gains in a loop around an integrator, one of them a square root. */
const ROOTED = {
  format: 'poleward-diagram',
  version: 1,
  title: 'Rooted',
  parameters: [
    { name: 'k', value: '2' },
    { name: 'omega_n', value: '3' },
  ],
  blocks: [
    { id: 'u', kind: 'input' },
    { id: 'sum', kind: 'summer', signs: '+-' },
    { id: 'g', kind: 'gain', gain: 'omega_n^2/k' },
    { id: 'x', kind: 'integrator' },
    { id: 'h', kind: 'gain', gain: 'sqrt(k)' },
    { id: 'y', kind: 'output' },
  ],
  wires: [
    { from: ['u', 0], to: ['sum', 0] },
    { from: ['sum', 0], to: ['g', 0] },
    { from: ['g', 0], to: ['x', 0] },
    { from: ['x', 0], to: ['h', 0] },
    { from: ['h', 0], to: ['sum', 1] },
    { from: ['x', 0], to: ['y', 0] },
  ],
};

/** Parameter values without a factor in common, so that different formulas give different numbers. */
const VALUES = ['R', 'L', 'Ke', 'Kt', 'J', 'b'].map((name, i) => ({ name, value: `${[3, 7, 11, 13, 17, 19][i]}/23` }));

describe('entries in symbols', () => {
  test('are those of the reference case as functions of the parameters', () => {
    const { symbolic } = modelFile(derived(motor.diagram));
    const scope = evaluateParameters(VALUES);
    if (symbolic === null || !scope.ok) throw new Error('the motor has formulas');
    const exactly = (rows: readonly (readonly string[])[]) =>
      rows.map(row =>
        row.map(text => {
          const value = evaluateQuantity(text, scope.value);
          return value.ok ? value.value.exact : text;
        }),
      );
    for (const key of ['A', 'B', 'C', 'D'] as const) {
      expect(exactly(symbolic[key])).toEqual(exactly(motor.expect.symbolic[key]));
    }
  });

  test('stand in the plain text table', () => {
    const { diagram, derivation } = derived(motor.diagram);
    const text = textIn('text', derivation, 'symbols', diagram);
    expect(text).toContain('d/dt i      -R/L  -Ke/L      0  |    1/L     0\n');
    expect(text).toContain('d/dt omega  Kt/J   -b/J      0  |      0  -1/J\n');
  });

  test('stand in LaTeX and MathML as people write them, irrational parts as they were typed', () => {
    const { diagram, derivation } = derived(ROOTED);
    const latex = textIn('latex', derivation, 'symbols', diagram);
    expect(latex).toContain('\\frac{{\\omega_{\\mathrm{n}}}^{2}}{k}');
    expect(latex).toContain('\\sqrt{k}');
    expect(textIn('mathml', derivation, 'symbols', diagram)).toContain('<msqrt>');
    expect(modelFile({ diagram, derivation }).exact).toBeNull();
    expect(modelFile({ diagram, derivation }).symbolic?.B).toEqual([['omega_n^2/k']]);
  });

  test('are fractions, and that is said, where the formulas are of another model', () => {
    const { derivation } = derived(motor.diagram);
    const other = derived(ROOTED).diagram;
    const text = textIn('text', derivation, 'symbols', other);
    expect(text).toContain('-50/3');
    expect(text).toContain(
      '\nEntries are fractions. The general model has other states than the one at the present values.\n',
    );
  });
});
