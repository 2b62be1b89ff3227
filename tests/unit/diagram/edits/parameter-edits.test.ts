import { describe, expect, test } from 'vitest';
import { type Diagram, editDiagram } from '../../../../src/diagram/index.ts';
import { DRAWING } from './small-drawing.ts';
import { changesNothing, edited, refusals } from './try-edit.ts';

const names = (diagram: Diagram) => diagram.parameters.map(({ name }) => name);

describe('adding a parameter', () => {
  test('puts it last or where it is told, without blank texts', () => {
    const parameter = { name: 'n', value: ' 3 ', unit: '', note: ' turns ' };
    const after = edited(DRAWING, { kind: 'addParameter', parameter });
    expect(after.parameters.at(-1)).toEqual({ name: 'n', value: '3', note: 'turns' });
    expect(names(edited(DRAWING, { kind: 'addParameter', parameter, index: 0 }))).toEqual(['n', 'k', 'm']);
    expect(names(edited(DRAWING, { kind: 'addParameter', parameter, index: 99 }))).toEqual(['k', 'm', 'n']);
  });

  test('is refused where its name is taken or none', () => {
    expect(refusals(DRAWING, { kind: 'addParameter', parameter: { name: 'k', value: '1' } })).toEqual([
      'duplicate-name: Parameter k: there is one of this name already. Choose another name.',
    ]);
    expect(refusals(DRAWING, { kind: 'addParameter', parameter: { name: 's', value: '1' } })).toEqual([
      'bad-value: Parameter s: s is the Laplace variable. Choose another name.',
    ]);
    expect(refusals(DRAWING, { kind: 'addParameter', parameter: { name: '2k', value: '1' } })).toEqual([
      'bad-value: Parameter 2k: A parameter’s name begins with a letter and has letters, digits and underscores only.',
    ]);
  });

  test('is refused beyond 5,000', () => {
    const parameters = Array.from({ length: 5000 }, (_, i) => ({ name: `p${i}`, value: '1' }));
    expect(
      refusals({ ...DRAWING, parameters }, { kind: 'addParameter', parameter: { name: 'q', value: '1' } }),
    ).toEqual(['too-large: A drawing has at most 5000 parameters. Remove one first.']);
  });
});

describe('removing a parameter', () => {
  test('takes it out of the table and leaves the texts that use it', () => {
    const after = edited(DRAWING, { kind: 'removeParameter', name: 'k' });
    expect(names(after)).toEqual(['m']);
    expect(after.blocks).toEqual(DRAWING.blocks);
  });

  test('that is gone is refused', () => {
    expect(refusals(DRAWING, { kind: 'removeParameter', name: 'z' })).toEqual([
      'unknown-parameter: There is no parameter z. Choose one that is there.',
    ]);
  });
});

describe('renaming a parameter', () => {
  test('follows it into blocks, groups, values and tolerances', () => {
    const tolerant: Diagram = {
      ...DRAWING,
      parameters: [...DRAWING.parameters, { name: 'n', value: 'k2', tolerance: 'k/10' }],
      blocks: [
        ...DRAWING.blocks,
        { id: 'M', kind: 'state-model', A: [['k', '1']].slice(1), B: [], C: [[]], D: [['-k']], initial: [] },
        { id: 'G', kind: 'transfer-function', numerator: 'k', denominator: 'k*s + k2' },
        { id: 'l', kind: 'limiter', lower: '-k', upper: 'k' },
        { id: 'd', kind: 'delay', time: '1/k' },
        { id: 'q', kind: 'integrator', initial: 'k' },
      ],
    };
    const after = edited(tolerant, { kind: 'renameParameter', from: 'k', to: 'K_p' });
    expect(after.parameters).toEqual([
      { name: 'K_p', value: '2' },
      { name: 'm', value: '1/K_p', tolerance: '10 %' },
      { name: 'n', value: 'k2', tolerance: 'K_p/10' },
    ]);
    expect(after.blocks).toMatchObject([
      { id: 'u' },
      { id: 'e' },
      { gain: 'K_p' },
      { id: 'x' },
      { id: 'y' },
      { sheet: { blocks: [{ id: 'a' }, { gain: '2*K_p' }, { id: 'b' }, { id: 'sum' }, { id: 'out' }] } },
      { D: [['-K_p']] },
      { numerator: 'K_p', denominator: 'K_p*s + k2' },
      { lower: '-K_p', upper: 'K_p' },
      { time: '1/K_p' },
      { initial: 'K_p' },
    ]);
  });

  test('keeps the identity of blocks that do not use it', () => {
    const result = editDiagram(DRAWING, { kind: 'renameParameter', from: 'm', to: 'mass' });
    expect(result.ok && result.value.blocks).toBe(DRAWING.blocks);
    expect(result.ok && result.value.parameters[0]).toBe(DRAWING.parameters[0]);
  });

  test('to its own name is no change; to a taken one or none, or of one that is gone, is refused', () => {
    expect(changesNothing(DRAWING, { kind: 'renameParameter', from: 'k', to: 'k' })).toBe(true);
    expect(refusals(DRAWING, { kind: 'renameParameter', from: 'k', to: 'm' })).toEqual([
      'duplicate-name: Parameter m: there is one of this name already. Choose another name.',
    ]);
    expect(refusals(DRAWING, { kind: 'renameParameter', from: 'k', to: 'sin' })).toEqual([
      'bad-value: Parameter sin: sin is a function. Choose another name.',
    ]);
    expect(refusals(DRAWING, { kind: 'renameParameter', from: 'z', to: 'y' })).toEqual([
      'unknown-parameter: There is no parameter z. Choose one that is there.',
    ]);
  });
});

describe('setting a parameter', () => {
  test('sets what is given and takes away what is blank', () => {
    const after = edited(DRAWING, { kind: 'setParameter', name: 'm', value: '3', unit: 'kg', note: 'n' });
    expect(after.parameters[1]).toEqual({ name: 'm', value: '3', unit: 'kg', tolerance: '10 %', note: 'n' });
    const less = edited(after, { kind: 'setParameter', name: 'm', unit: ' ', tolerance: '' });
    expect(less.parameters[1]).toEqual({ name: 'm', value: '3', note: 'n' });
  });

  test('to what it is is no change, of one that is gone is refused', () => {
    expect(changesNothing(DRAWING, { kind: 'setParameter', name: 'm', value: '1/k', unit: '' })).toBe(true);
    expect(refusals(DRAWING, { kind: 'setParameter', name: 'z', value: '1' })).toEqual([
      'unknown-parameter: There is no parameter z. Choose one that is there.',
    ]);
  });
});

describe('ordering parameters', () => {
  test('puts those named first', () => {
    expect(names(edited(DRAWING, { kind: 'reorderParameters', names: ['m'] }))).toEqual(['m', 'k']);
    expect(changesNothing(DRAWING, { kind: 'reorderParameters', names: ['k', 'm', 'k'] })).toBe(true);
    expect(refusals(DRAWING, { kind: 'reorderParameters', names: ['z'] })).toEqual([
      'unknown-parameter: There is no parameter z. Choose one that is there.',
    ]);
  });
});

describe('the title block', () => {
  test('is set field by field', () => {
    const fields = { title: 'Winch', notes: 'n', revision: '3', date: '2026-12-01', author: 'A. N.' };
    const after = edited(DRAWING, { kind: 'setTitleFields', ...fields });
    expect(after).toEqual({ ...DRAWING, ...fields });
    expect(
      edited(after, { kind: 'setTitleFields', title: 'small', notes: '', revision: '', date: '', author: '' }),
    ).toEqual(DRAWING);
    expect(changesNothing(DRAWING, { kind: 'setTitleFields', title: 'small', author: '' })).toBe(true);
  });
});

describe('the range of a slider', () => {
  test('is set, kept by other edits and taken away by null', () => {
    const after = edited(DRAWING, { kind: 'setParameter', name: 'm', range: ['0', '1/2'] });
    expect(after.parameters[1]).toEqual({ ...DRAWING.parameters[1], range: ['0', '1/2'] });
    expect(changesNothing(after, { kind: 'setParameter', name: 'm', range: ['0', '1/2'] })).toBe(true);
    expect(edited(after, { kind: 'setParameter', name: 'm', value: '3' }).parameters[1]?.range).toEqual(['0', '1/2']);
    expect(edited(after, { kind: 'setParameter', name: 'm', range: null })).toEqual(DRAWING);
  });
});
