import { describe, expect, test } from 'vitest';
import type { Point } from '../../../../src/diagram/index.ts';
import { bentVia, piecesOf } from '../../../../src/ui/sheet/bend-wire.ts';
import { nearestOn } from '../../../../src/ui/sheet/wire-gesture.ts';

const route: readonly Point[] = [
  [0, 0],
  [100, 0],
  [100, 80],
  [200, 80],
];

function bent(points: readonly Point[], piece: number, to: number): readonly Point[] {
  const found = piecesOf(points).find(({ index }) => index === piece);
  if (found === undefined) throw new Error('no such piece');
  return bentVia(points, found, to, 20);
}

/** Whether every piece of the whole route is horizontal or vertical. */
function isRightAngled(points: readonly Point[], via: readonly Point[]): boolean {
  const [first, last] = [points[0], points.at(-1)];
  if (first === undefined || last === undefined) return false;
  const whole = [first, ...via, last];
  return whole.slice(1).every(([x, y], index) => x === whole[index]?.[0] || y === whole[index]?.[1]);
}

describe('bending a wire', () => {
  test('shifts a piece between two bends and nothing else', () => {
    expect(bent(route, 1, 60)).toEqual([
      [60, 0],
      [60, 80],
    ]);
  });

  test('leaves a stub at the port that a piece starts at', () => {
    const via = bent(route, 0, -40);
    expect(via).toEqual([
      [20, 0],
      [20, -40],
      [100, -40],
      [100, 80],
    ]);
    expect(isRightAngled(route, via)).toBe(true);
  });

  test('leaves a stub at the port that a piece ends at', () => {
    const via = bent(route, 2, 120);
    expect(via).toEqual([
      [100, 0],
      [100, 120],
      [180, 120],
      [180, 80],
    ]);
    expect(isRightAngled(route, via)).toBe(true);
  });

  test('steps a straight wire over between two stubs', () => {
    const straight: readonly Point[] = [
      [0, 0],
      [90, 0],
    ];
    expect(bent(straight, 0, 50)).toEqual([
      [20, 0],
      [20, 50],
      [70, 50],
      [70, 0],
    ]);
  });

  test('knows pieces by their direction and leaves out those without a length', () => {
    const pieces = piecesOf([
      [0, 0],
      [0, 0],
      [0, 30],
    ]);
    expect(pieces).toEqual([{ index: 1, isHorizontal: false, middle: [0, 15], length: 30 }]);
  });
});

describe('a branch from a wire', () => {
  test('starts at the nearest point of it', () => {
    expect(nearestOn(route, [104, 33])).toEqual({ at: [100, 33], isHorizontal: false });
    expect(nearestOn(route, [-20, 5])).toEqual({ at: [0, 0], isHorizontal: true });
  });

  test('starts nowhere on a wire without a length', () => {
    expect(nearestOn([[0, 0]], [1, 1])).toBeNull();
  });
});
