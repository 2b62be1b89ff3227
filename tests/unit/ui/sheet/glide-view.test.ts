import { describe, expect, test } from 'vitest';
import { viewBetween, ZOOM_ENDS, zoomedAbout } from '../../../../src/ui/sheet/glide-view.ts';

const NEAR = { x: 40, y: -30, zoom: 2 };
const FAR = { x: 100, y: 60, zoom: 0.5 };

/** Where a view shows a place of the sheet, in the sheet's own pixels. */
const shown = ({ x, y, zoom }: typeof NEAR, [px, py]: readonly [number, number]) => [x + zoom * px, y + zoom * py];

describe('a glide between two views', () => {
  test('begins at the one and ends at the other', () => {
    expect(viewBetween(NEAR, FAR, 0)).toEqual(NEAR);
    expect(viewBetween(NEAR, FAR, 1)).toEqual(FAR);
  });

  test('is half way by equal factors of the zoom at half its time', () => {
    expect(viewBetween(NEAR, FAR, 0.5).zoom).toBeCloseTo(1, 14);
  });

  test('moves evenly where the zoom stays', () => {
    expect(viewBetween({ x: 0, y: 0, zoom: 1 }, { x: 10, y: -4, zoom: 1 }, 0.5)).toEqual({ x: 5, y: -2, zoom: 1 });
  });

  test('keeps the one point still that both views show at the same place', () => {
    // x + zoom·p is the same in both: 40 + 2 p = 100 + 0.5 p gives p = 40; −30 + 2 q = 60 + 0.5 q gives q = 60.
    const place = [40, 60] as const;
    for (const passed of [0.1, 0.3, 0.5, 0.8]) {
      const [x, y] = shown(viewBetween(NEAR, FAR, passed), place);
      expect(x).toBeCloseTo(120, 10);
      expect(y).toBeCloseTo(90, 10);
    }
  });
});

describe('a zoom about a place', () => {
  test('leaves what is shown there where it is', () => {
    const after = zoomedAbout(NEAR, [300, 200], 1.2);
    // The place of the sheet at (300, 200) is ((300 − 40)/2, (200 + 30)/2).
    const [x, y] = shown(after, [130, 115]);
    expect(x).toBeCloseTo(300, 10);
    expect(y).toBeCloseTo(200, 10);
    expect(after.zoom).toBeCloseTo(2.4, 14);
  });

  test('stops at the nearest and the farthest view', () => {
    expect(zoomedAbout(NEAR, [0, 0], 100).zoom).toBe(ZOOM_ENDS.largest);
    expect(zoomedAbout(NEAR, [0, 0], 1e-9).zoom).toBe(ZOOM_ENDS.smallest);
  });
});
