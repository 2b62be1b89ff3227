import { expect, test } from 'vitest';
import { compile } from '../../../../src/compile/index.ts';
import type { Diagram } from '../../../../src/diagram/index.ts';
import { answer } from '../../../../src/worker/topics/workings.ts';
import { valueOf } from '../../results.ts';

const LAG: Diagram = {
  format: 'poleward-diagram',
  version: 1,
  title: '',
  parameters: [
    { name: 'k', value: '3' },
    { name: 'w2', value: 'k/2' },
  ],
  blocks: [
    { id: 'u', kind: 'input' },
    { id: 'g', kind: 'gain', gain: 'w2' },
    { id: 'x', kind: 'integrator' },
    { id: 'y', kind: 'output' },
  ],
  wires: [
    { from: ['u', 0], to: ['g', 0] },
    { from: ['g', 0], to: ['x', 0] },
    { from: ['x', 0], to: ['y', 0] },
  ],
};

const subject = { diagram: LAG, derivation: valueOf(compile(LAG)) };

test('the workings on demand keep the name of a derived parameter until it is written out', () => {
  const last = (expanded: boolean) => {
    const { sections } = valueOf(answer(subject, { notation: 'symbols', expanded }));
    return sections.at(-1)?.lines.map(({ text }) => text);
  };
  expect(last(false)).toEqual(['d/dt x = w2*u', 'y = x']);
  expect(last(true)).toEqual(['d/dt x = k/2*u', 'y = x']);
});

test('the workings on demand come whole in three notations to be copied', () => {
  const { text, latex, mathml } = valueOf(answer(subject, { notation: 'fractions', expanded: false }));
  expect(text).toContain('d/dt x = 3/2*u');
  expect(latex).toContain('\\frac{3}{2} \\, u');
  expect(mathml).toMatch(/^<math .*<mn>3<\/mn>.*<\/math>$/);
});
