import { expect, test } from 'vitest';
import { titleBlockPlace } from '../../../../src/ui/title-block/title-block-place.ts';

const AREA = { left: 0, top: 0, right: 1000, bottom: 700 };
const SIZES = { open: { width: 400, height: 200 }, folded: { width: 400, height: 30 } };

const box = (left: number, top: number) => ({ left, top, right: left + 50, bottom: top + 50 });
const LOWER_RIGHT = box(800, 550);
const LOWER_LEFT = box(100, 550);
const UPPER_RIGHT = box(800, 100);

test('the title block stays where it is while no block is under it', () => {
  expect(titleBlockPlace('lower-right', SIZES, AREA, [LOWER_LEFT])).toEqual({
    corner: 'lower-right',
    isFolded: false,
  });
  expect(titleBlockPlace('upper-right', SIZES, AREA, [])).toEqual({ corner: 'upper-right', isFolded: false });
});

test('it goes to the first free corner', () => {
  expect(titleBlockPlace('lower-right', SIZES, AREA, [LOWER_RIGHT]).corner).toBe('lower-left');
  expect(titleBlockPlace('lower-right', SIZES, AREA, [LOWER_RIGHT, LOWER_LEFT]).corner).toBe('upper-right');
  expect(titleBlockPlace('upper-right', SIZES, AREA, [UPPER_RIGHT]).corner).toBe('lower-right');
});

test('it folds where no corner is free, and the fold looks for a free corner too', () => {
  expect(titleBlockPlace('lower-right', SIZES, AREA, [LOWER_RIGHT, LOWER_LEFT, UPPER_RIGHT])).toEqual({
    corner: 'lower-right',
    isFolded: true,
  });
  const low = { ...LOWER_RIGHT, bottom: 690 };
  expect(titleBlockPlace('lower-right', SIZES, AREA, [low, LOWER_LEFT, UPPER_RIGHT])).toEqual({
    corner: 'lower-left',
    isFolded: true,
  });
});

test('folded by hand it is only moved', () => {
  const sizes = { ...SIZES, open: null };
  expect(titleBlockPlace('lower-right', sizes, AREA, [LOWER_RIGHT])).toEqual({
    corner: 'lower-right',
    isFolded: true,
  });
});

test('blocks that only touch its edge are not hidden', () => {
  expect(titleBlockPlace('lower-right', SIZES, AREA, [box(550, 600)]).corner).toBe('lower-right');
  expect(titleBlockPlace('lower-right', SIZES, AREA, [box(551, 600)]).corner).toBe('lower-left');
});
