import fc from 'fast-check';
import { describe, expect, test, vi } from 'vitest';
import { type Diagram, readDiagram, startingDrawing, writeDiagram } from '../../../src/diagram/index.ts';
import { EXIT_STATUS } from '../../../src/problem/index.ts';
import { anyDiagram } from '../../arbitraries/diagrams.ts';
import { SEED } from '../../arbitraries/rationals.ts';

vi.setConfig({ testTimeout: 60_000 }); // many small runs, on a machine that may be busy

/** Either a document that can be written and read again, or problems with messages for one line of the screen. */
function expectAnAnswer(text: string): void {
  const result = readDiagram(text);
  if (result.ok) {
    const written = writeDiagram(result.value);
    expect(readDiagram(written)).toEqual({ ok: true, value: result.value });
    return;
  }
  expect(result.problems.length).toBeGreaterThan(0);
  expect(result.problems.length).toBeLessThanOrEqual(100);
  for (const { code, message, blocks } of result.problems) {
    expect(EXIT_STATUS[code]).toBe(2);
    expect(message).toMatch(/^[^\p{Cc}]+\.$/u);
    expect(message.length).toBeLessThan(1500);
    expect(blocks.every(path => typeof path === 'string')).toBe(true);
  }
}

const STRANGE: readonly unknown[] = [
  ...[null, true, false, 0, -1, 1.5, 1e300, '', ' ', 's', '__proto__', 'constructor', '\u0000\n', 'x'.repeat(300)],
  ...[[], [[]], {}, ['b0', 0], ['b0', -1], ['b0', 1e9], [0, 0], [1e300, 0], { blocks: [] }, { blocks: [], wires: [] }],
  ...['group', 'input', 'summer', 'state-model', '+-+-', '9'.repeat(400)],
];

interface Holder {
  readonly object: Record<string, unknown>;
  readonly key: string;
}

function holders(value: unknown): Holder[] {
  if (typeof value !== 'object' || value === null) return [];
  const object = value as Record<string, unknown>;
  return Object.keys(object).flatMap(key => [{ object, key }, ...holders(object[key])]);
}

const copied = (value: unknown): unknown => JSON.parse(JSON.stringify(value));

const start = fc.oneof(anyDiagram, fc.constant(startingDrawing()));

describe('reading never throws', () => {
  test('on a drawing with values replaced, removed, copied or added anywhere', () => {
    const change = fc.record({
      place: fc.nat(),
      other: fc.nat(),
      value: fc.constantFrom(...STRANGE),
      way: fc.constantFrom('replace', 'remove', 'copy', 'add', 'rename'),
    });
    const damage = (
      diagram: Diagram,
      changes: readonly (typeof change extends fc.Arbitrary<infer T> ? T : never)[],
    ) => {
      const copy: unknown = JSON.parse(JSON.stringify(diagram));
      for (const { place, other, value, way } of changes) {
        const all = holders(copy);
        const target = all[place % all.length];
        const source = all[other % all.length];
        if (target === undefined || source === undefined) continue;
        const { object, key } = target;
        if (way === 'replace') object[key] = copied(value);
        else if (way === 'remove') delete object[key];
        else if (way === 'copy') object[key] = copied(source.object[source.key] ?? null);
        else if (way === 'add') object[`extra${other % 3}`] = copied(value);
        else object[source.key] = copied(object[key] ?? null);
      }
      return JSON.stringify(copy);
    };
    fc.assert(
      fc.property(start, fc.array(change, { minLength: 1, maxLength: 4 }), (diagram, changes) => {
        expectAnAnswer(damage(diagram, changes));
      }),
      { seed: SEED, numRuns: 500 },
    );
  });

  test('on text cut, repeated or with characters changed', () => {
    fc.assert(
      fc.property(
        start,
        fc.nat(),
        fc.nat({ max: 20 }),
        fc.string({ unit: 'binary', maxLength: 4 }),
        (diagram, at, cut, by) => {
          const text = writeDiagram(diagram);
          const place = at % text.length;
          expectAnAnswer(text.slice(0, place) + by + text.slice(place + cut));
        },
      ),
      { seed: SEED, numRuns: 300 },
    );
  });

  test('on any JSON and any text', () => {
    fc.assert(fc.property(fc.oneof(fc.json({ maxDepth: 6 }), fc.string({ unit: 'binary' })), expectAnAnswer), {
      seed: SEED,
      numRuns: 500,
    });
  });
});
