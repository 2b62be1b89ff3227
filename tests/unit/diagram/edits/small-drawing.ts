/** A loop small enough to see through: u → e → K → x → y, x back to e; and a group of two ports beside it. */

import type { Block, Diagram, Wire } from '../../../../src/diagram/index.ts';

export const GROUP: Block = {
  id: 'S',
  kind: 'group',
  name: 'drive',
  at: [400, 0],
  sheet: {
    blocks: [
      { id: 'a', kind: 'input' },
      { id: 'g', kind: 'gain', gain: '2*k' },
      { id: 'b', kind: 'input' },
      { id: 'sum', kind: 'summer', signs: '++' },
      { id: 'out', kind: 'output' },
    ],
    wires: [
      { from: ['a', 0], to: ['g', 0] },
      { from: ['g', 0], to: ['sum', 0] },
      { from: ['b', 0], to: ['sum', 1] },
      { from: ['sum', 0], to: ['out', 0] },
    ],
  },
};

export const BLOCKS: readonly Block[] = [
  { id: 'u', kind: 'input', at: [0, 0] },
  { id: 'e', kind: 'summer', signs: '+-', at: [100, 0] },
  { id: 'K', kind: 'gain', gain: 'k', at: [200, 0] },
  { id: 'x', kind: 'integrator', at: [300, 0] },
  { id: 'y', kind: 'output', at: [500, 0] },
  GROUP,
];

export const WIRES: readonly Wire[] = [
  { from: ['u', 0], to: ['e', 0], name: 'set point' },
  { from: ['e', 0], to: ['K', 0] },
  { from: ['K', 0], to: ['x', 0], via: [[250, 10]] },
  { from: ['x', 0], to: ['e', 1] },
  { from: ['x', 0], to: ['S', 0] },
  { from: ['u', 0], to: ['S', 1] },
  { from: ['S', 0], to: ['y', 0] },
];

export const DRAWING: Diagram = {
  format: 'poleward-diagram',
  version: 1,
  title: 'small',
  parameters: [
    { name: 'k', value: '2' },
    { name: 'm', value: '1/k', tolerance: '10 %' },
  ],
  blocks: BLOCKS,
  wires: WIRES,
};
