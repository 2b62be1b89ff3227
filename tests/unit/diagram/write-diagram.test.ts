import { describe, expect, test } from 'vitest';
import { type Diagram, emptyDiagram, minifyDiagram, readDiagram, writeDiagram } from '../../../src/diagram/index.ts';
import { valueOf } from '../results.ts';

const DIAGRAM: Diagram = {
  wires: [{ to: ['S', 0], from: ['u', 0], via: [[10, 20.5]] }],
  blocks: [
    { kind: 'input', at: [0, 0], id: 'u' },
    {
      kind: 'group',
      note: 'two deep',
      sheet: {
        wires: [],
        blocks: [{ kind: 'gain', gain: '"2" k', id: 'g', mirrored: true }],
      },
      id: 'S',
    },
  ],
  parameters: [{ value: '1', name: 'k', tolerance: '10 %' }],
  title: 'a "b"\n',
  version: 1,
  format: 'poleward-diagram',
};

describe('a written diagram', () => {
  test('has its fields in one order and one block a line', () => {
    expect(writeDiagram(DIAGRAM)).toBe(`{
  "format": "poleward-diagram",
  "version": 1,
  "title": "a \\"b\\"\\n",
  "parameters": [
    { "name": "k", "value": "1", "tolerance": "10 %" }
  ],
  "blocks": [
    { "id": "u", "kind": "input", "at": [0, 0] },
    { "id": "S", "kind": "group", "note": "two deep", "sheet": {
      "blocks": [
        { "id": "g", "kind": "gain", "gain": "\\"2\\" k", "mirrored": true }
      ],
      "wires": []
    } }
  ],
  "wires": [
    { "from": ["u", 0], "to": ["S", 0], "via": [[10, 20.5]] }
  ]
}
`);
  });

  test('of an empty sheet is a diagram', () => {
    expect(JSON.parse(writeDiagram(emptyDiagram('t')))).toEqual(emptyDiagram('t'));
  });

  test('does not depend on the order in which the fields were made', () => {
    const reordered: Diagram = { ...emptyDiagram(), ...DIAGRAM, blocks: [...DIAGRAM.blocks], title: DIAGRAM.title };
    expect(writeDiagram(reordered)).toBe(writeDiagram(DIAGRAM));
    expect(minifyDiagram(reordered)).toBe(minifyDiagram(DIAGRAM));
  });

  test('is the same document as its minified form, which has no space outside texts', () => {
    expect(JSON.parse(minifyDiagram(DIAGRAM))).toEqual(JSON.parse(writeDiagram(DIAGRAM)));
    expect(minifyDiagram(DIAGRAM)).not.toMatch(/[:,[{] /);
  });

  test('keeps every field that a file can have', () => {
    const text = JSON.stringify({
      ...emptyDiagram('t'),
      revision: '2',
      date: 'd',
      author: 'a',
      notes: 'n',
      parameters: [{ name: 'k', value: '1', unit: 'u', tolerance: 't', note: 'n', range: ['0', '5'] }],
      blocks: [
        { id: 'u', kind: 'input', name: 'n', unit: 'N', at: [0, 0], mirrored: true, note: 'n' },
        { id: 'a', kind: 'summer', signs: '+-' },
        { id: 'x', kind: 'integrator', initial: '1', unit: 'm' },
        { id: 'G', kind: 'transfer-function', numerator: '1', denominator: 's + 1' },
        { id: 'M', kind: 'state-model', A: [['1']], B: [['1']], C: [['1']], D: [['0']], initial: ['1'] },
        { id: 'd', kind: 'delay', time: '0.1', order: 10 },
        { id: 'D', kind: 'differentiator' },
        { id: 'l', kind: 'limiter', lower: '-1', upper: '1' },
      ],
      wires: [{ from: ['u', 0], to: ['a', 1], name: 'n', via: [[1, 2]] }],
    });
    const diagram = valueOf(readDiagram(text));
    expect(diagram).toEqual(JSON.parse(text));
    expect(valueOf(readDiagram(writeDiagram(diagram)))).toEqual(diagram);
    expect(valueOf(readDiagram(minifyDiagram(diagram)))).toEqual(diagram);
  });
});
