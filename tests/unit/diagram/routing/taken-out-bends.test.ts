import { expect, test } from 'vitest';
import type { Sheet } from '../../../../src/diagram/index.ts';
import { rerouteMoved, routeWires } from '../../../../src/diagram/routing/index.ts';

test('a wire whose bend points are taken out is routed as if it had never had any', () => {
  const blocks: Sheet['blocks'] = [
    { id: 'a', kind: 'gain', gain: '1', at: [0, 0] },
    { id: 'b', kind: 'gain', gain: '2', at: [200, 0] },
  ];
  const ends = { from: ['a', 0], to: ['b', 0] } as const;
  const via = [
    [60, 0],
    [60, 100],
    [140, 100],
    [140, 0],
  ] as const;
  const bent: Sheet = { blocks, wires: [{ ...ends, via }] };
  const plain: Sheet = { blocks, wires: [ends] };
  const before = routeWires(bent);
  expect(before.wires[0]?.points).toContainEqual([60, 100]);
  expect(rerouteMoved(before, bent, plain)).toEqual(routeWires(plain));
});
