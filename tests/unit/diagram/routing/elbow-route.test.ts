import { describe, expect, test } from 'vitest';
import { elbowRoute, type PortEnd, type Route } from '../../../../src/diagram/routing/index.ts';

const SIDES = ['left', 'right', 'top', 'bottom'] as const;
const OUT = { left: [-1, 0], right: [1, 0], top: [0, -1], bottom: [0, 1] } as const;

/** The direction of a route's first piece. */
function firstStep(route: Route): readonly number[] {
  const [[x0, y0] = [0, 0], [x1, y1] = [0, 0]] = route;
  return [Math.sign(x1 - x0), Math.sign(y1 - y0)];
}

describe('a plain elbow', () => {
  const ends = SIDES.flatMap(from => SIDES.map(to => [from, to] as const));
  const places = [
    [200, 0],
    [200, 130],
    [-200, 130],
    [-200, 0],
    [0, 300],
    [30, 10],
  ] as const;

  test.each(ends)('leaves the %s and enters the %s side straight, with level and upright pieces', (from, to) => {
    for (const [x, y] of places) {
      const start: PortEnd = { x: 0, y: 0, side: from };
      const route = elbowRoute(start, { x, y, side: to });
      expect(route[0]).toEqual([0, 0]);
      expect(route.at(-1)).toEqual([x, y]);
      expect(firstStep(route)).toEqual([...OUT[from]]);
      expect(firstStep(route.toReversed())).toEqual([...OUT[to]]);
      for (let index = 1; index < route.length; index += 1) {
        const [a = [0, 0], b = [0, 0]] = [route[index - 1], route[index]];
        expect(a[0] === b[0] || a[1] === b[1]).toBe(true);
      }
    }
  });

  test('changes height half way between two ports that face each other', () => {
    expect(elbowRoute({ x: 0, y: 0, side: 'right' }, { x: 100, y: 40, side: 'left' })).toEqual([
      [0, 0],
      [50, 0],
      [50, 40],
      [100, 40],
    ]);
  });

  test('is one line between two ports of one height', () => {
    expect(elbowRoute({ x: 0, y: 0, side: 'right' }, { x: 30, y: 0, side: 'left' })).toEqual([
      [0, 0],
      [30, 0],
    ]);
  });
});
