import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Root } from '../../../../src/ui/figures/index.ts';
import { mapFrame, mapSize, toPixels } from '../../../../src/ui/plots/pole-map-frame.ts';
import { placeRoots } from '../../../../src/ui/plots/pole-map-marks.ts';
import { SEED } from '../../../arbitraries/rationals.ts';

const part = fc.oneof(
  fc.constant(0),
  fc.double({ min: -1e6, max: 1e6, noNaN: true }),
  fc.double({ min: -1e-6, max: 1e-6, noNaN: true }),
);
const roots: fc.Arbitrary<readonly Root[]> = fc
  .array(fc.tuple(part, part, fc.integer({ min: 1, max: 3 })), { maxLength: 8 })
  .map(list => list.map(([re, im, multiplicity]) => ({ re, im, multiplicity })));
const view = fc.constantFrom('dominant', 'all');

test('every root has a place inside the frame, and one that is not beyond it has its own', () => {
  fc.assert(
    fc.property(roots, roots, view, fc.integer({ min: 160, max: 900 }), (poles, zeros, view, width) => {
      const frame = mapFrame(poles, zeros, view, mapSize(width));
      for (const { root, x, y, isBeyond } of placeRoots(frame, poles, zeros)) {
        expect(x).toBeGreaterThan(frame.left);
        expect(x).toBeLessThan(frame.right);
        expect(y).toBeGreaterThan(frame.top);
        expect(y).toBeLessThan(frame.bottom);
        if (!isBeyond) expect([x, y]).toEqual(toPixels(frame, root.re, root.im));
        if (view === 'all') expect(isBeyond).toBe(false);
      }
    }),
    { seed: SEED, numRuns: 300 },
  );
});

test('the axes have ticks, all of them on the frame', () => {
  fc.assert(
    fc.property(roots, view, (poles, view) => {
      const frame = mapFrame(poles, [], view, mapSize(260));
      expect(frame.realAxis.ticks.length).toBeGreaterThan(0);
      for (const { value } of frame.realAxis.ticks) {
        const [x] = toPixels(frame, value, 0);
        expect(x).toBeGreaterThanOrEqual(frame.left - 1e-6 * frame.width);
        expect(x).toBeLessThanOrEqual(frame.right + 1e-6 * frame.width);
      }
    }),
    { seed: SEED, numRuns: 200 },
  );
});
