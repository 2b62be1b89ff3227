import { describe, expect, test } from 'vitest';
import { entryLeft, entryPointed, NOTHING_POINTED } from '../../../../src/ui/store/pointing.ts';

const hovered = entryPointed(NOTHING_POINTED, 1, 2, 'hover');
const kept = entryPointed(hovered, 1, 2, 'keep');

describe('pointing at an entry', () => {
  test('follows the pointer until one is kept', () => {
    expect(entryPointed(hovered, 0, 0, 'hover').entry).toEqual({ row: 0, column: 0 });
    expect(entryPointed(kept, 0, 0, 'hover')).toBe(kept);
    expect(entryPointed(kept, 0, 0, 'keep').entry).toEqual({ row: 0, column: 0 });
  });

  test('ends with the pointer’s leaving only where it was the pointer’s', () => {
    expect(entryLeft(hovered, 'hover').entry).toBeNull();
    expect(entryLeft(kept, 'hover')).toBe(kept);
    const walked = entryPointed(NOTHING_POINTED, 1, 1, 'walk');
    expect(entryLeft(walked, 'hover')).toBe(walked);
    expect(entryLeft(walked, 'walk').entry).toBeNull();
    expect(entryLeft(kept, 'walk')).toBe(kept);
  });

  test('lets go of what is kept by Escape and by keeping it again', () => {
    expect(entryLeft(kept, 'escape').entry).toBeNull();
    expect(entryPointed(kept, 1, 2, 'keep').entry).toBeNull();
  });
});
