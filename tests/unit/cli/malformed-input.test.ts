/** Whatever comes in, what comes out is one of the four endings, and never a stack trace. */

import fc from 'fast-check';
import { expect, test } from 'vitest';
import { drawingOf } from './cases.ts';
import { type Outcome, runOn } from './machine.ts';

const SEED = 20261201;
const TEXTS = ['groups-nested-two-deep', 'biproper-loop-refused', 'dead-time-loop-margins-and-steps'].map(drawingOf);

/** Status 0 with an answer, or 2 or 3 with nothing printed and lines of the one form. */
function expectAnEnding({ status, printed, complaints }: Outcome, isCheck: boolean): void {
  expect([0, 2, 3]).toContain(status);
  for (const line of complaints) {
    expect(line).toMatch(/^poleward: [a-z]+(-[a-z]+)*: [^\p{Cc}]+$/u);
    expect(line).not.toMatch(/\bat \S+:\d+:\d+/);
  }
  if (status !== 0) expect(printed).toBe('');
  if (status !== 0 && !isCheck) expect(complaints.length).toBeGreaterThan(0);
}

async function expectEndings(text: string): Promise<void> {
  for (const command of ['derive', 'check', 'link']) {
    expectAnEnding(await runOn({ files: {}, standardInput: text }, command, '-'), command === 'check');
  }
}

test('any text ends properly', async () => {
  await fc.assert(fc.asyncProperty(fc.string({ unit: 'binary' }), expectEndings), { seed: SEED, numRuns: 200 });
});

test('any JSON ends properly', async () => {
  await fc.assert(fc.asyncProperty(fc.json({ maxDepth: 4 }), expectEndings), { seed: SEED, numRuns: 200 });
});

/** A drawing with one value, anywhere inside, replaced by another of the wrong kind. */
const distorted = fc
  .record({
    text: fc.constantFrom(...TEXTS),
    place: fc.nat(),
    value: fc.constantFrom<unknown>(
      null,
      true,
      -1,
      1e300,
      1.5,
      '',
      's',
      '1/0',
      '2 k',
      's^-1',
      '9^9^9',
      '('.repeat(300),
      [],
      [[]],
      {},
      ['sum', 0],
      'input',
      'group',
      'poleward-model',
    ),
  })
  .map(({ text, place, value }) => {
    const diagram: unknown = JSON.parse(text);
    const places = placesIn(diagram);
    const [holder, key] = places[place % places.length] ?? [{}, ''];
    holder[key] = value;
    return JSON.stringify(diagram);
  });

/** Every key of every object and list, with what holds it. */
function placesIn(value: unknown): [Record<string, unknown>, string][] {
  if (typeof value !== 'object' || value === null) return [];
  const holder = value as Record<string, unknown>;
  return Object.keys(holder).flatMap(key => [
    [holder, key] as [Record<string, unknown>, string],
    ...placesIn(holder[key]),
  ]);
}

test('a drawing with one value distorted ends properly', async () => {
  await fc.assert(fc.asyncProperty(distorted, expectEndings), { seed: SEED, numRuns: 400 });
});

test('a drawing cut short or with a character changed ends properly', async () => {
  const damaged = fc
    .record({ text: fc.constantFrom(...TEXTS), at: fc.nat(), by: fc.string({ maxLength: 2 }), cut: fc.nat({ max: 3 }) })
    .map(({ text, at, by, cut }) => text.slice(0, at % text.length) + by + text.slice((at % text.length) + cut));
  await fc.assert(fc.asyncProperty(damaged, expectEndings), { seed: SEED, numRuns: 300 });
});

test('any link ends properly', async () => {
  const payload = fc.oneof(
    fc.string(),
    fc.uint8Array({ maxLength: 60 }).map(bytes => Buffer.from(bytes).toString('base64url')),
  );
  await fc.assert(
    fc.asyncProperty(payload, async text => {
      for (const command of ['derive', 'check']) {
        expectAnEnding(await runOn({ files: {} }, command, `#d1=${text}`), command === 'check');
      }
    }),
    { seed: SEED, numRuns: 200 },
  );
});

test('any arguments end properly', async () => {
  const words = [
    'derive',
    'check',
    'link',
    '-',
    '--',
    '--as',
    '--set',
    '--out',
    '--notation',
    'csv',
    'k=1',
    '--as=',
    '#d1=',
    'x',
  ];
  const argument = fc.oneof(fc.constantFrom(...words), fc.string({ maxLength: 6 }));
  await fc.assert(
    fc.asyncProperty(fc.array(argument, { maxLength: 5 }), async argv => {
      const outcome = await runOn({ files: { x: TEXTS[0] ?? '' } }, ...argv);
      expect([0, 2, 3]).toContain(outcome.status);
      for (const line of outcome.complaints) expect(line).toMatch(/^poleward: [a-z]+(-[a-z]+)*: [^\p{Cc}]+$/u);
    }),
    { seed: SEED, numRuns: 500 },
  );
});
