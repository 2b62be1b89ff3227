import { describe, expect, test } from 'vitest';
import { type Block, emptyDiagram, readDiagram } from '../../../../src/diagram/index.ts';
import { valueOf } from '../../results.ts';
import { file, sheet } from './files.ts';

describe('a file is read', () => {
  test('with nothing in it but an empty list of blocks', () => {
    expect(readDiagram(sheet([]))).toEqual({ ok: true, value: emptyDiagram() });
    expect(valueOf(readDiagram(file({ blocks: [] })))).toEqual(emptyDiagram());
  });

  test('with a byte order mark in front', () => {
    expect(readDiagram(`\uFEFF${sheet([])}`).ok).toBe(true);
  });

  test('with every field of every kind', () => {
    const blocks: readonly Block[] = [
      { id: 'u', kind: 'input', unit: 'N', at: [0, -20.5], name: 'force', mirrored: true, note: 'n' },
      { id: 'y', kind: 'output', unit: 'm' },
      { id: 'g', kind: 'gain', gain: 'k' },
      { id: 'a', kind: 'summer', signs: '+-+-+-+-+-+-+-+-' },
      { id: 'x', kind: 'integrator', initial: '1', unit: 'm' },
      { id: 'G', kind: 'transfer-function', numerator: '1', denominator: 's + 1' },
      { id: 'M', kind: 'state-model', A: [['1']], B: [['1', '2']], C: [['1']], D: [['0', '0']], initial: ['1'] },
      { id: 'd', kind: 'delay', time: '0.1', order: 10 },
      { id: 'D', kind: 'differentiator' },
      { id: 'l', kind: 'limiter', lower: '-1', upper: '1' },
      { id: 'S', kind: 'group', sheet: { blocks: [{ id: 'u', kind: 'input' }], wires: [] } },
    ];
    const wires = [{ from: ['u', 0], to: ['S', 0], name: 'f', via: [[1, 2]] }];
    const parameters = [{ name: 'k', value: '1', unit: 'm', tolerance: '10 %', note: 'n', range: ['0', '5'] }];
    const head = { title: 't', notes: 'n', revision: '2', date: 'd', author: 'a' };
    expect(valueOf(readDiagram(file({ ...head, parameters, blocks, wires })))).toEqual({
      format: 'poleward-diagram',
      version: 1,
      ...head,
      parameters,
      blocks,
      wires,
    });
  });

  test('with JSON numbers as their shortest decimals', () => {
    const blocks = [
      { id: 'g', kind: 'gain', gain: 0.1 },
      { id: 'h', kind: 'gain', gain: -1e21 },
      { id: 'M', kind: 'state-model', A: [[1]], B: [[-2.5]], C: [['c']], D: [[0]] },
    ];
    const parameters = [{ name: 'c', value: 1e-7, tolerance: 0.5 }];
    expect(valueOf(readDiagram(file({ parameters, blocks })))).toMatchObject({
      parameters: [{ value: '1e-7', tolerance: '0.5' }],
      blocks: [{ gain: '0.1' }, { gain: '-1e+21' }, { A: [['1']], B: [['-2.5']] }],
    });
  });

  test('without the fields that the format does not have', () => {
    const text = `{"format":"poleward-diagram","version":1,"extra":{"deep":[1]},"__proto__":{"polluted":1},
      "blocks":[{"id":"g","kind":"gain","gain":"1","numerator":"s","__proto__":{"polluted":1},"constructor":2}],
      "wires":[],"parameters":[{"name":"k","value":"1","color":"red"}]}`;
    const diagram = valueOf(readDiagram(text));
    expect(diagram.blocks).toEqual([{ id: 'g', kind: 'gain', gain: '1' }]);
    expect(diagram.parameters).toEqual([{ name: 'k', value: '1' }]);
    expect(Object.keys(diagram)).not.toContain('extra');
    expect(Object.getPrototypeOf(diagram.blocks[0])).toBe(Object.prototype);
    expect('polluted' in {}).toBe(false);
  });

  test('without the optional fields that say nothing', () => {
    const blank = { name: '', note: '', mirrored: false };
    const blocks = [
      { id: 'u', kind: 'input', unit: '', ...blank },
      { id: 'y', kind: 'output' },
    ];
    const wires = [{ from: ['u', 0], to: ['y', 0], name: '', via: [] }];
    expect(valueOf(readDiagram(file({ title: '', notes: '', blocks, wires })))).toEqual({
      ...emptyDiagram(),
      blocks: [
        { id: 'u', kind: 'input' },
        { id: 'y', kind: 'output' },
      ],
      wires: [{ from: ['u', 0], to: ['y', 0] }],
    });
  });

  test('with ids and names that every object has', () => {
    const ids = ['constructor', 'toString', 'hasOwnProperty', 'valueOf'];
    const blocks = ids.map(id => ({ id, kind: 'integrator', name: id === 'valueOf' ? '__proto__' : id }));
    const wires = ids.map(id => ({ from: [id, 0], to: [id, 0] }));
    const parameters = ids.map(name => ({ name, value: '1' }));
    const read = valueOf(readDiagram(file({ blocks, wires, parameters })));
    expect(read.blocks.map(({ id, name }) => [id, name])).toEqual(blocks.map(({ id, name }) => [id, name]));
  });

  test('with expressions that mean nothing yet', () => {
    expect(readDiagram(sheet([{ id: 'g', kind: 'gain', gain: '2 k' }])).ok).toBe(true);
  });
});
