import { describe, expect, test } from 'vitest';
import { ownPart } from '../../../../src/ui/sheet/own-part.ts';

describe('a wire is inked from where it leaves the wires drawn before it', () => {
  const straight = [
    [0, 0],
    [100, 0],
  ] as const;

  test('the first wire of a port is inked whole', () => {
    expect(ownPart(straight, [])).toEqual(straight);
  });

  test('a branch half way along a straight wire starts at its dot', () => {
    const branch = [
      [0, 0],
      [40, 0],
      [40, 60],
    ] as const;
    expect(ownPart(branch, [straight])).toEqual([
      [40, 0],
      [40, 60],
    ]);
  });

  test('a wire that goes on beyond an earlier bend starts there', () => {
    const bent = [
      [0, 0],
      [40, 0],
      [40, 60],
    ] as const;
    expect(ownPart(straight, [bent])).toEqual([
      [40, 0],
      [100, 0],
    ]);
  });

  test('of several earlier wires the one shared longest counts', () => {
    const near = [
      [0, 0],
      [20, 0],
      [20, 60],
    ] as const;
    const far = [
      [0, 0],
      [80, 0],
      [80, -60],
    ] as const;
    expect(ownPart(straight, [near, far])).toEqual([
      [80, 0],
      [100, 0],
    ]);
  });
});
