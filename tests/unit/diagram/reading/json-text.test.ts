import { describe, expect, test } from 'vitest';
import { MAXIMUM_BYTES, readDiagram } from '../../../../src/diagram/index.ts';
import { file, messages, sheet } from './files.ts';

describe('text is refused', () => {
  test('that is no JSON', () => {
    for (const text of ['', 'hello', '{"format":', '[1,', '\uFEFF\uFEFF{}']) {
      expect(messages(text)).toEqual([
        'not-a-diagram: The text is not JSON, so it holds no diagram. Open a *.poleward.json file.',
      ]);
    }
  });

  test('that is JSON of something else', () => {
    for (const text of ['null', '1', '[]', '{}', '"poleward-diagram"', '{"format":"other","version":1}']) {
      expect(messages(text)).toEqual([
        'not-a-diagram: This is no Poleward diagram: its "format" is not "poleward-diagram". Open a *.poleward.json file.',
      ]);
    }
  });

  test('that has the format only by inheritance', () => {
    const text = '{"__proto__":{"format":"poleward-diagram","version":1,"blocks":[]}}';
    expect(messages(text)[0]).toMatch(/^not-a-diagram: /);
  });

  test('that is a model file', () => {
    expect(messages('{"format":"poleward-model","version":1}')).toEqual([
      'not-a-diagram: This is a model file, not a drawing. Open the *.poleward.json file it was made from.',
    ]);
  });

  test.each([
    ['2', 'version "2"'],
    ['"1"', 'version "1"'],
    ['null', 'no version'],
    ['[1]', 'no version'],
  ])('of version %s', (version, found) => {
    expect(messages(`{"format":"poleward-diagram","version":${version},"blocks":[]}`)).toEqual([
      `wrong-version: The diagram has ${found}, this program reads version 1. Open it with a newer program.`,
    ]);
  });

  test('of more than 4 MiB, counted in bytes', () => {
    const padded = (letter: string, bytes: number) => {
      const [head, tail] = ['{"format":"poleward-diagram","version":1,"blocks":[],"notes":"', '"}'];
      const width = new TextEncoder().encode(letter).length;
      const room = bytes - head.length - tail.length;
      return head + letter.repeat(Math.floor(room / width)) + 'a'.repeat(room % width) + tail;
    };
    for (const letter of ['a', 'é', '√', '😀']) {
      const text = padded(letter, MAXIMUM_BYTES);
      expect(new TextEncoder().encode(text).length).toBe(MAXIMUM_BYTES);
      expect(readDiagram(text).ok).toBe(true);
      expect(messages(`${text} `)).toEqual([
        'too-large: The diagram is larger than 4 MiB. Split it into several drawings.',
      ]);
    }
  });

  test('nested so deep that a parser would run out of stack', () => {
    const expected = ['too-large: The text is nested more than 128 deep. Groups go 32 deep, so this is no diagram.'];
    expect(messages('['.repeat(1_000_000))).toEqual(expected);
    expect(messages(`${'{"a":'.repeat(200_000)}1${'}'.repeat(200_000)}`)).toEqual(expected);
    expect(messages(`{"format":"poleward-diagram","version":1,"x":${'['.repeat(128)}${']'.repeat(128)}}`)).toEqual(
      expected,
    );
    expect(readDiagram(file({ blocks: [], x: JSON.parse(`${'['.repeat(127)}${']'.repeat(127)}`) })).ok).toBe(true);
  });

  test('but brackets inside a string are no nesting', () => {
    expect(readDiagram(file({ blocks: [], notes: `\\"${'['.repeat(500)}\\` })).ok).toBe(true);
  });

  const groups = (depth: number): object =>
    depth === 0 ? { blocks: [], wires: [] } : { blocks: [{ id: 'g', kind: 'group', sheet: groups(depth - 1) }] };

  test('with groups more than 32 deep', () => {
    expect(readDiagram(file(groups(32))).ok).toBe(true);
    const path = Array(33).fill('g').join('.');
    expect(messages(file(groups(33)))).toEqual([
      `too-large: Group ${path}: it stands inside 32 other groups, which is as deep as they go. Open up one of them.`,
    ]);
  });

  test('with more than 20,000 blocks, those in groups counted', () => {
    const many = (count: number) => Array.from({ length: count }, (_, i) => ({ id: `g${i}`, kind: 'differentiator' }));
    const inGroup = (count: number) => [{ id: 'S', kind: 'group', sheet: { blocks: many(10_000) } }, ...many(count)];
    expect(readDiagram(sheet(inGroup(9_999))).ok).toBe(true);
    expect(messages(sheet(inGroup(10_000)))).toEqual(['too-large: The diagram has more than 20000 blocks. Split it.']);
    expect(messages(sheet(many(20_001)))).toEqual(['too-large: The diagram has more than 20000 blocks. Split it.']);
  });

  test('with more than 5,000 parameters', () => {
    const parameters = Array.from({ length: 5001 }, (_, i) => ({ name: `p${i}`, value: '1' }));
    expect(readDiagram(file({ blocks: [], parameters: parameters.slice(1) })).ok).toBe(true);
    expect(messages(file({ blocks: [], parameters }))).toEqual([
      'too-large: The diagram has 5001 parameters, 5000 at most are read.',
    ]);
  });
});
