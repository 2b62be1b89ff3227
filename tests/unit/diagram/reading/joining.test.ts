import { describe, expect, test } from 'vitest';
import { readDiagram } from '../../../../src/diagram/index.ts';
import { problemsOf } from '../../results.ts';
import { file, messages, sheet } from './files.ts';

describe('parts that do not fit together are refused', () => {
  const integrator = (id: string, name?: string) => ({
    id,
    kind: 'integrator',
    ...(name === undefined ? {} : { name }),
  });
  const group = (id: string, blocks: readonly unknown[], wires: readonly unknown[] = [], name?: string) => ({
    id,
    kind: 'group',
    ...(name === undefined ? {} : { name }),
    sheet: { blocks, wires },
  });
  const wire = (from: string, output: number, to: string, input: number) => ({ from: [from, output], to: [to, input] });

  test('an id twice on a sheet', () => {
    expect(messages(sheet([integrator('x'), { id: 'x', kind: 'differentiator' }]))).toEqual([
      'duplicate-id: More than one block on the sheet has the id x. Give each an id of its own.',
    ]);
    expect(messages(sheet([group('S', [integrator('x'), integrator('x'), integrator('x')])]))).toEqual([
      'duplicate-id: More than one block in group S has the id x. Give each an id of its own.',
    ]);
  });

  test('but one id on two sheets is no clash', () => {
    expect(readDiagram(sheet([integrator('x'), group('S', [integrator('x')])])).ok).toBe(true);
  });

  test('two states of one name', () => {
    const result = readDiagram(sheet([integrator('a', 'x'), integrator('x')]));
    expect(problemsOf(result)).toEqual([
      'duplicate-name: Two states have the name x: integrator x (a) and integrator x (x). Rename one.',
    ]);
    expect(result.ok ? [] : result.problems[0]?.blocks).toEqual(['a', 'x']);
  });

  test('two states of one name by way of groups', () => {
    const blocks = [group('S', [integrator('x')], [], 'g'), group('T', [integrator('x')], [], 'g')];
    expect(messages(sheet(blocks))).toEqual([
      'duplicate-name: Two states have the name g.x: integrator g.x (S.x) and integrator g.x (T.x). Rename one.',
    ]);
    expect(messages(sheet([integrator('a', 'g.x'), group('g', [integrator('x')])]))).toEqual([
      'duplicate-name: Two states have the name g.x: integrator g.x (a) and integrator g.x (g.x). Rename one.',
    ]);
  });

  test('a state with the name of one of a state model’s or a dead time’s', () => {
    const model = { id: 'M', kind: 'state-model', A: [['1']], B: [['1']], C: [['1']], D: [['0']] };
    expect(messages(sheet([integrator('M_1'), model]))).toEqual([
      'duplicate-name: Two states have the name M_1: integrator M_1 (M_1) and state model M (M). Rename one.',
    ]);
    const delay = { id: 'd', kind: 'delay', time: '1' };
    expect(messages(sheet([delay, integrator('d_2')]))).toEqual([
      'duplicate-name: Two states have the name d_2: dead time d (d) and integrator d_2 (d_2). Rename one.',
    ]);
    expect(readDiagram(sheet([delay, integrator('d_3')])).ok).toBe(true);
  });

  test('two inputs or two outputs of one name', () => {
    const io = (kind: string) => [
      { id: 'a', kind, name: 'z' },
      { id: 'z', kind },
    ];
    expect(messages(sheet(io('input')))).toEqual([
      'duplicate-name: Two inputs have the name z: input z (a) and input z (z). Rename one.',
    ]);
    expect(messages(sheet(io('output')))).toEqual([
      'duplicate-name: Two outputs have the name z: output z (a) and output z (z). Rename one.',
    ]);
    expect(messages(sheet([group('S', io('input'))]))).toEqual([
      'duplicate-name: Two inputs have the name S.z: input S.z (S.a) and input S.z (S.z). Rename one.',
    ]);
  });

  test('but a state, an input and an output may share one', () => {
    const blocks = [
      { id: 'a', kind: 'input', name: 'z' },
      { id: 'b', kind: 'output', name: 'z' },
      { id: 'c', kind: 'integrator', name: 'z' },
      { id: 'd', kind: 'gain', gain: '1', name: 'z' },
    ];
    expect(readDiagram(sheet(blocks)).ok).toBe(true);
  });

  test('parameters of one name, or of a name that is none', () => {
    const parameters = ['k', 's', '2x', 'k', '', 'sin', 'k', 'pi'].map(name => ({ name, value: '1' }));
    const illegal = 'A parameter’s name begins with a letter and has letters, digits and underscores only.';
    const result = readDiagram(file({ blocks: [], parameters }));
    expect(problemsOf(result)).toEqual([
      'bad-value: Parameter s: s is the Laplace variable. Choose another name.',
      `bad-value: Parameter 2x: ${illegal}`,
      'duplicate-name: Parameter k: it is defined more than once. Keep one of the definitions.',
      `bad-value: Parameter without a name: ${illegal}`,
      'bad-value: Parameter sin: sin is a function. Choose another name.',
      'bad-value: Parameter pi: pi is a constant. Choose another name.',
    ]);
    expect(result.ok ? [] : result.problems[2]?.parameter).toBe('k');
  });

  test('a wire to or from a block that is not there', () => {
    const result = readDiagram(sheet([integrator('x')], [wire('y', 0, 'x', 0), wire('x', 0, 'a\tb', 1)]));
    expect(problemsOf(result)).toEqual([
      'missing-block: The wire from y (output 0) to x (input 0): there is no block y on the sheet. Correct the id.',
      'missing-block: The wire from x (output 0) to a b (input 1): there is no block a b on the sheet. Correct the id.',
    ]);
    expect(messages(sheet([integrator('x'), group('S', [], [wire('x', 0, 'x', 0)])]))).toEqual([
      'missing-block: The wire from x (output 0) to x (input 0): there is no block x in group S. Correct the id.',
      'missing-block: The wire from x (output 0) to x (input 0): there is no block x in group S. Correct the id.',
    ]);
  });

  test('a wire to or from a port that is not there', () => {
    const blocks = [
      { id: 'u', kind: 'input' },
      { id: 'e', kind: 'summer', signs: '+-' },
      { id: 'y', kind: 'output' },
      group('S', [{ id: 'u', kind: 'input' }]),
    ];
    const wires = [
      wire('u', 1, 'e', 0),
      wire('e', 0, 'e', 2),
      wire('y', 0, 'y', 0),
      wire('e', 0, 'u', 0),
      wire('S', 0, 'S', 1),
    ];
    const result = readDiagram(sheet(blocks, wires));
    expect(problemsOf(result)).toEqual([
      'missing-port: The wire from u (output 1) to e (input 0): Input u has one output, number 0. Join another port.',
      'missing-port: The wire from e (output 0) to e (input 2): Summing point e has 2 inputs, numbers 0 to 1. Join another port.',
      'missing-port: The wire from y (output 0) to y (input 0): Output y has no output. Join another port.',
      'missing-port: The wire from e (output 0) to u (input 0): Input u has no input. Join another port.',
      'missing-port: The wire from S (output 0) to S (input 1): Group S has no output. Join another port.',
      'missing-port: The wire from S (output 0) to S (input 1): Group S has one input, number 0. Join another port.',
    ]);
    expect(result.ok ? [] : result.problems[0]?.blocks).toEqual(['u']);
  });

  test('two wires to one input port', () => {
    const blocks = [
      { id: 'u', kind: 'input' },
      { id: 'e', kind: 'summer', signs: '++' },
    ];
    expect(messages(sheet(blocks, [wire('u', 0, 'e', 1), wire('u', 0, 'e', 0), wire('u', 0, 'e', 1)]))).toEqual([
      'port-taken: Summing point e: more than one wire leads to its input 1. Keep one of them.',
    ]);
  });

  test('all of them at once', () => {
    expect(
      messages(sheet([integrator('x'), integrator('x')], [wire('x', 0, 'z', 0), wire('x', 5, 'x', 0)])),
    ).toHaveLength(3);
  });
});
