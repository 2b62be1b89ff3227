import { describe, expect, test } from 'vitest';
import { alignedPlaces, type Frame, spreadPlaces } from '../../../../src/ui/commands/align.ts';

/** A frame by its centre and size. */
const frame = (id: string, x: number, y: number, width: number, height: number): Frame => ({
  id,
  rectangle: { left: x - width / 2, right: x + width / 2, top: y - height / 2, bottom: y + height / 2 },
});

const small = frame('a', 0, 0, 20, 20);
const wide = frame('b', 100, 50, 60, 40);

describe('aligned blocks', () => {
  test('share the leftmost edge and keep their heights', () => {
    // The leftmost edge is −10; half of 60 from it is 20.
    expect(alignedPlaces([small, wide], 'left')).toEqual([
      ['a', [0, 0]],
      ['b', [20, 50]],
    ]);
  });

  test('share the rightmost edge', () => {
    // The rightmost edge is 130; half of 20 before it is 120.
    expect(alignedPlaces([small, wide], 'right')).toEqual([
      ['a', [120, 0]],
      ['b', [100, 50]],
    ]);
  });

  test('share the upper or the lower edge', () => {
    expect(alignedPlaces([small, wide], 'top')).toEqual([
      ['a', [0, 0]],
      ['b', [100, 10]],
    ]);
    expect(alignedPlaces([small, wide], 'bottom')).toEqual([
      ['a', [0, 60]],
      ['b', [100, 50]],
    ]);
  });

  test('share a centre half way between the outermost ones', () => {
    expect(alignedPlaces([small, wide], 'row').map(([, at]) => at[1])).toEqual([25, 25]);
    expect(alignedPlaces([small, wide], 'column').map(([, at]) => at[0])).toEqual([50, 50]);
  });
});

describe('spread blocks', () => {
  test('get equal gaps between their frames while the first and last stay', () => {
    const frames = [frame('a', 0, 0, 20, 20), frame('b', 30, 5, 40, 20), frame('c', 200, 0, 20, 20)];
    // From 10 to 190 there are 180; 40 of them are the middle frame, so each gap is 70 and its centre 10 + 70 + 20.
    expect(spreadPlaces(frames, 'across')).toEqual([
      ['a', [0, 0]],
      ['b', [100, 5]],
      ['c', [200, 0]],
    ]);
  });

  test('get equal distances between centres where the frames overlap', () => {
    const frames = [frame('a', 0, 0, 20, 100), frame('b', 0, 10, 20, 100), frame('c', 0, 60, 20, 100)];
    expect(spreadPlaces(frames, 'down').map(([, at]) => at[1])).toEqual([0, 30, 60]);
  });

  test('stay where they are when there are only two', () => {
    expect(spreadPlaces([small, wide], 'across')).toEqual([
      ['a', [0, 0]],
      ['b', [100, 50]],
    ]);
  });
});
