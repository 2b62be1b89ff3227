import { describe, expect, test } from 'vitest';
import { markupText, type Root } from '../../../../src/ui/figures/index.ts';
import { FILE, poleMapDrawing, svgFile } from '../../../../src/ui/plots/index.ts';
import { mapFrame, mapReach, mapSize, roundedUp, toPixels, toPlane } from '../../../../src/ui/plots/pole-map-frame.ts';
import { borderGroups, placeRoots } from '../../../../src/ui/plots/pole-map-marks.ts';
import { pointerAfter, pointerAt, pointerWords, steps } from '../../../../src/ui/plots/pole-map-pointer.ts';
import { mapSummary, pointWords, rootWords } from '../../../../src/ui/plots/pole-map-words.ts';

const root = (re: number, im = 0, multiplicity = 1): Root => ({ re, im, multiplicity });
const pair = (re: number, im: number) => [root(re, im), root(re, -im)];
const winch = [...pair(-0.354272, 0.586117), root(-3.18056), root(-20.1108)];
const zeros = [root(-0.8)];
const size = mapSize(260);

describe('what the frame takes in', () => {
  test('a pole eight times as far as the dominant one is in, a farther one is not', () => {
    expect(mapReach([root(-1), root(-8)], [], 'dominant')).toBe(8);
    expect(mapReach([root(-1), root(-8.001)], [], 'dominant')).toBe(1);
    expect(mapReach([root(-1), root(-8.001)], [], 'all')).toBe(8.001);
  });

  test('the rightmost pole is the dominant one, not the nearest to the origin', () => {
    expect(mapReach([root(-1), ...pair(-0.1, 100)], [], 'dominant')).toBeCloseTo(100, 3);
  });

  test('a pole at the origin, or what rounding made of one, sets no scale', () => {
    expect(mapReach([root(0), root(-1), root(-5)], [], 'dominant')).toBe(5);
    expect(mapReach([root(1e-15), root(-1), root(-5)], [], 'dominant')).toBe(5);
    expect(mapReach([root(1e-6), root(-1), root(-5)], [], 'dominant')).toBe(1e-6);
  });

  test('a model without poles or with all at the origin has a frame', () => {
    expect(mapReach([], [], 'dominant')).toBe(1);
    expect(mapReach([root(0, 0, 3)], [], 'all')).toBe(1);
    expect(mapReach([], [root(-7)], 'dominant')).toBe(7);
    expect(mapReach([root(0)], [root(-7)], 'dominant')).toBe(7);
  });

  test('extents go up to the preferred numbers of ISO 3', () => {
    expect([1, 1.01, 3.1, 9.9, 0.032, 640].map(roundedUp)).toEqual(
      [1, 1.25, 3.15, 10, 0.04, 800].map(value => expect.closeTo(value, 9)),
    );
  });

  test('a small change of a pole leaves the frame where it is', () => {
    const moved = [...pair(-0.36, 0.58), root(-3.17), root(-20.3)];
    expect(mapFrame(moved, zeros, 'dominant', size)).toEqual(mapFrame(winch, zeros, 'dominant', size));
  });

  test('both axes have one scale and the origin is inside', () => {
    for (const poles of [winch, [root(5)], pair(-1e-5, 3e-5), pair(-3, 4000)]) {
      const frame = mapFrame(poles, [], 'all', size);
      const [x0, y0] = toPixels(frame, 0, 0);
      const [x1, y1] = toPixels(frame, 1, 1);
      expect(x1 - x0).toBeCloseTo(y0 - y1, 9);
      expect(x0).toBeGreaterThan(frame.left);
      expect(x0).toBeLessThan(frame.right);
      expect(toPlane(frame, x1, y1).re).toBeCloseTo(1, 6);
    }
  });
});

describe('marks', () => {
  const frame = mapFrame(winch, zeros, 'dominant', size);
  const placed = placeRoots(frame, winch, zeros);

  test('lie at their place, or at the border in their direction', () => {
    expect(placed.map(({ isBeyond }) => isBeyond)).toEqual([false, false, false, true, false]);
    const far = placed[3];
    expect(far?.y).toBeCloseTo(frame.originY, 9);
    expect(far?.x).toBeCloseTo(frame.left + 9, 9);
  });

  test('all lie inside the frame when all are wanted', () => {
    const all = mapFrame(winch, zeros, 'all', size);
    expect(placeRoots(all, winch, zeros).some(({ isBeyond }) => isBeyond)).toBe(false);
  });

  test('that fall on one place of the border are one, the nearest first', () => {
    const poles = [root(-1), root(-400), root(-90_000), root(-420)];
    const [group, ...others] = borderGroups(placeRoots(mapFrame(poles, [], 'dominant', size), poles, []));
    expect(others).toEqual([]);
    expect(group?.roots.map(({ re }) => re)).toEqual([-400, -420, -90_000]);
  });
});

describe('the drawing', () => {
  const words = (poles: readonly Root[], zeros: readonly Root[] | null) =>
    poleMapDrawing(poles, zeros, 'dominant', size, FILE).marks.map(markupText).join('');

  test('writes the value of what is beyond the frame at its border', () => {
    expect(words(winch, zeros)).toContain('>−20.1</text>');
    expect(words([root(-1), root(-400), root(-420)], [])).toContain('>−400 … −420 (2)</text>');
  });

  test('writes a multiplicity beside its mark', () => {
    expect(words([root(-1, 0, 3)], [])).toContain('>3</text>');
    expect(words([root(-1)], [])).not.toContain('>3</text>');
  });

  test('says in a file what it shows and holds no variable of the page', () => {
    const file = svgFile(poleMapDrawing(winch, zeros, 'dominant', size, FILE));
    expect(file).toContain('<desc>4 poles, 1 zero; 1 beyond the frame</desc>');
    expect(file).not.toContain('var(');
  });

  test('keeps every mark inside the picture, whatever the poles', () => {
    const sets = [winch, [root(1.5), ...pair(-2, 3), ...pair(-50, 300), root(-90_000)], [root(0)], []];
    for (const poles of sets) {
      for (const { x, y } of placeRoots(mapFrame(poles, [root(5000)], 'dominant', size), poles, [root(5000)])) {
        expect(x > 0 && x < size.width && y > 0 && y < size.height).toBe(true);
      }
    }
  });
});

describe('the words of a map', () => {
  const placed = placeRoots(mapFrame(winch, zeros, 'dominant', size), winch, zeros);

  test('count multiple roots as often as they are', () => {
    const double = [root(0, 0, 2), root(-1)];
    expect(mapSummary(placeRoots(mapFrame(double, [], 'dominant', size), double, []), true)).toBe('3 poles, no zeros');
  });

  test('tell zeros that were not computed from none', () => {
    expect(mapSummary(placed.slice(0, 1), false)).toBe('1 pole, zeros not computed');
  });

  test('say what a pole means', () => {
    expect(placed.map(rootWords)).toEqual([
      'pole −0.3543 + 0.5861j · ζ 0.517 · ω₀ 0.685 rad/s',
      'pole −0.3543 − 0.5861j · ζ 0.517 · ω₀ 0.685 rad/s',
      'pole −3.18056 · τ 0.314 s',
      'pole −20.1108 · τ 0.0497 s',
      'zero −0.8',
    ]);
  });

  test('of a point give its damping ratio and frequency', () => {
    expect(pointWords(-3, 4)).toBe('−3.00 + 4.00j · ζ 0.600 · ω₀ 5.00 rad/s');
    expect(pointWords(3, -4)).toBe('3.00 − 4.00j · ζ −0.600 · ω₀ 5.00 rad/s');
    expect(pointWords(0, 0)).toBe('0.00 + 0.00j');
  });
});

describe('pointing', () => {
  const frame = mapFrame(winch, zeros, 'dominant', size);
  const placed = placeRoots(frame, winch, zeros);
  const stops = steps(placed);

  test('a pair is one stop of the keyboard', () => {
    expect(stops.map(({ root }) => root.re)).toEqual([-0.354272, -3.18056, -20.1108, -0.8]);
  });

  test('the arrows go from stop to stop and end at the last', () => {
    const first = pointerAfter('ArrowRight', null, 4);
    expect(first).toEqual({ kind: 'root', stop: 0 });
    expect(pointerAfter('ArrowRight', first, 4)).toEqual({ kind: 'root', stop: 1 });
    expect(pointerAfter('ArrowRight', { kind: 'root', stop: 3 }, 4)).toEqual({ kind: 'root', stop: 3 });
    expect(pointerAfter('Home', { kind: 'root', stop: 3 }, 4)).toEqual({ kind: 'root', stop: 0 });
    expect(pointerAfter('Enter', null, 4)).toBeNull();
    expect(pointerAfter('ArrowRight', null, 0)).toBeNull();
  });

  test('the pointer is at the mark under it, the lower one of a pair included', () => {
    const lower = placed[1];
    expect(lower && pointerAt(frame, stops, placed, lower.x + 3, lower.y - 3)).toEqual({ kind: 'root', stop: 0 });
  });

  test('the pointer is elsewhere at a point of the plane, and outside the frame nowhere', () => {
    const [x, y] = toPixels(frame, -2, 1);
    const at = pointerAt(frame, stops, placed, x, y);
    expect(at).toEqual({ kind: 'point', x, y });
    expect(at && pointerWords(at, frame, stops)).toBe('−2.00 + 1.00j · ζ 0.894 · ω₀ 2.24 rad/s');
    expect(pointerAt(frame, stops, placed, 2, 2)).toBeNull();
  });
});
