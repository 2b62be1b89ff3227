import { expect, test } from 'vitest';
import { thinned } from '../../../src/storage/thinned.ts';

const version = (minute: number) => ({ at: new Date(minute * 60_000).toISOString(), blocks: 1, text: String(minute) });
const minutes = (list: readonly { text: string }[]) => list.map(({ text }) => Number(text));

test('versions that fit are left as they are', () => {
  const all = [0, 10, 20].map(version);
  expect(thinned(all, 3)).toEqual(all);
});

test('the version goes whose neighbours are closest in time; first and last stay', () => {
  expect(minutes(thinned([0, 1, 2, 50, 100].map(version), 4))).toEqual([0, 2, 50, 100]);
  expect(minutes(thinned([0, 50, 98, 99, 100].map(version), 2))).toEqual([0, 100]);
});

test('a thousand versions thin to fifty', () => {
  const left = minutes(
    thinned(
      Array.from({ length: 1000 }, (_, index) => version(index)),
      50,
    ),
  );
  expect(left).toHaveLength(50);
  expect([left[0], left.at(-1)]).toEqual([0, 999]);
});
