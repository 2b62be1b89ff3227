import { describe, expect, test } from 'vitest';
import { type Block, portCounts } from '../../../src/diagram/index.ts';

describe('ports', () => {
  test.each<readonly [Block, number, number]>([
    [{ id: 'a', kind: 'input' }, 0, 1],
    [{ id: 'a', kind: 'output' }, 1, 0],
    [{ id: 'a', kind: 'gain', gain: '1' }, 1, 1],
    [{ id: 'a', kind: 'summer', signs: '+-+' }, 3, 1],
    [{ id: 'a', kind: 'integrator' }, 1, 1],
    [{ id: 'a', kind: 'transfer-function', numerator: '1', denominator: 's' }, 1, 1],
    [{ id: 'a', kind: 'delay', time: '1' }, 1, 1],
    [{ id: 'a', kind: 'differentiator' }, 1, 1],
    [{ id: 'a', kind: 'limiter', lower: '0', upper: '1' }, 1, 1],
    [
      {
        id: 'a',
        kind: 'state-model',
        A: [['1']],
        B: [['1', '2']],
        C: [['1'], ['2'], ['3']],
        D: [
          ['0', '0'],
          ['0', '0'],
          ['0', '0'],
        ],
      },
      2,
      3,
    ],
    [{ id: 'a', kind: 'state-model', A: [], B: [], C: [[]], D: [['1', '2']] }, 2, 1],
    [{ id: 'a', kind: 'state-model', A: [['1']], B: [[]], C: [], D: [] }, 0, 0],
  ])('%o has %d inputs and %d outputs', (block, inputs, outputs) => {
    expect(portCounts(block)).toEqual({ inputs, outputs });
  });

  test('of a group are its sheet’s inputs and outputs, not those of groups inside', () => {
    const inner: Block = { id: 'T', kind: 'group', sheet: { blocks: [{ id: 'u', kind: 'input' }], wires: [] } };
    const blocks: Block[] = [
      inner,
      { id: 'y', kind: 'output' },
      { id: 'a', kind: 'input' },
      { id: 'b', kind: 'input' },
    ];
    expect(portCounts({ id: 'S', kind: 'group', sheet: { blocks, wires: [] } })).toEqual({ inputs: 2, outputs: 1 });
  });
});
