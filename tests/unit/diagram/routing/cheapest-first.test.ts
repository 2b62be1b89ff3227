import fc from 'fast-check';
import { expect, test } from 'vitest';
import { CheapestFirst } from '../../../../src/diagram/routing/cheapest-first.ts';
import { SEED } from '../../../arbitraries/rationals.ts';

function emptied(queue: CheapestFirst): number[] {
  const entries: number[] = [];
  for (let entry = queue.pop(); entry >= 0; entry = queue.pop()) entries.push(entry);
  return entries;
}

test('the cheapest entry comes first, of equal ones the latest', () => {
  fc.assert(
    fc.property(fc.array(fc.integer({ min: 0, max: 20 }), { maxLength: 3000 }), costs => {
      const queue = new CheapestFirst();
      for (const [entry, cost] of costs.entries()) queue.push(entry, cost);
      const expected = costs.map((cost, entry) => ({ cost, entry }));
      expected.sort((a, b) => a.cost - b.cost || b.entry - a.entry);
      expect(emptied(queue)).toEqual(expected.map(({ entry }) => entry));
    }),
    { seed: SEED, numRuns: 50 },
  );
});

test('an emptied queue gives −1', () => {
  const queue = new CheapestFirst();
  queue.push(7, 1);
  queue.clear();
  expect(queue.pop()).toBe(-1);
});
