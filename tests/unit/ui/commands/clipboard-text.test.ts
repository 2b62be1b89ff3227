import { describe, expect, test } from 'vitest';
import { type Diagram, emptyDiagram, readDiagram } from '../../../../src/diagram/index.ts';
import { broughtParameters, clipboardText, readClipboard } from '../../../../src/ui/commands/clipboard-text.ts';

const drawing: Diagram = {
  ...emptyDiagram(),
  title: 'Loop',
  parameters: [
    { name: 'k', value: '2*m' },
    { name: 'm', value: '3' },
    { name: 'unused', value: '5' },
  ],
  blocks: [
    { id: 'u', kind: 'input', at: [0, 0] },
    { id: 'K', kind: 'gain', gain: 'k', at: [100, 0] },
    { id: 'x', kind: 'integrator', at: [200, 0] },
  ],
  wires: [
    { from: ['u', 0], to: ['K', 0] },
    { from: ['K', 0], to: ['x', 0] },
  ],
};

describe('copied blocks', () => {
  test('are a drawing of their own in the file format, with the wires between them and the parameters they need', () => {
    const read = readDiagram(clipboardText(drawing, new Set(['K', 'x'])));
    if (!read.ok) throw new Error(read.problems[0]?.message);
    expect(read.value.blocks).toEqual(drawing.blocks.slice(1));
    expect(read.value.wires).toEqual([{ from: ['K', 0], to: ['x', 0] }]);
    expect(read.value.parameters.map(({ name }) => name)).toEqual(['k', 'm']);
  });

  test('come back from the text', () => {
    const read = readClipboard(clipboardText(drawing, new Set(['u'])));
    expect(read.ok && read.value.blocks).toEqual(drawing.blocks.slice(0, 1));
  });
});

describe('text that cannot be pasted', () => {
  const message = (text: string) => {
    const read = readClipboard(text);
    return read.ok ? null : read.problems[0]?.message;
  };

  test('that is no drawing is refused with what to do', () => {
    expect(message('hello')).toBe('The clipboard holds no blocks but other text. Copy some blocks first.');
  });

  test('that is empty is refused', () => {
    expect(message('  ')).toBe('The clipboard is empty. Copy some blocks first.');
    expect(message(clipboardText(drawing, new Set()))).toBe('The copied drawing is empty. Copy some blocks first.');
  });

  test('that is a faulty drawing is refused with the reader’s own words', () => {
    const faulty = clipboardText(drawing, new Set(['u'])).replace('"input"', '"inputt"');
    const read = readDiagram(faulty);
    expect(read.ok).toBe(false);
    expect(message(faulty)).toBe(read.ok ? '' : read.problems[0]?.message);
    expect(message(faulty)).toContain('inputt');
  });
});

describe('parameters of a pasted drawing', () => {
  test('come along where they are missing, and keep the sheet’s value where they are there', () => {
    const own = [
      { name: 'k', value: '1' },
      { name: 'same', value: '7' },
    ];
    const pasted = [
      { name: 'k', value: '2' },
      { name: 'same', value: '7' },
      { name: 'fresh', value: '3' },
    ];
    expect(broughtParameters(own, pasted)).toEqual({ missing: [{ name: 'fresh', value: '3' }], kept: ['k'] });
  });
});
