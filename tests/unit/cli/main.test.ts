/** The command line on a machine in memory: what each command prints, says and writes, and how it ends. */

import { describe, expect, test } from 'vitest';
import packageFile from '../../../package.json';
import { CAUTION } from '../../../src/deliver/index.ts';
import { decodeLink } from '../../../src/share/index.ts';
import { differentiator, draw, gain, input, integrator, output, sum } from '../../arbitraries/draw.ts';
import { drawingOf, referenceCase } from './cases.ts';
import { type Outcome, runOn } from './machine.ts';

const MOTOR = { files: { motor: drawingOf('dc-motor-symbolic') } };
const OPEN_PORT = { files: { open: drawingOf('open-port-reads-zero') } };

const json = ({ printed }: Outcome): Record<string, unknown> => JSON.parse(String(printed));

describe('derive', () => {
  test('prints the model file', async () => {
    const outcome = await runOn(MOTOR, 'derive', 'motor');
    const { states, inputs, outputs, A, B, C, D, exact, stability, controllable, observable } =
      referenceCase('dc-motor-symbolic').expect;
    expect(outcome).toMatchObject({ status: 0, complaints: [] });
    expect(json(outcome)).toMatchObject({ format: 'poleward-model', version: 1 });
    expect(json(outcome)).toMatchObject({ states, inputs, outputs, A, B, C, D, exact });
    expect(json(outcome)).toMatchObject({ stability, controllable, observable });
  });

  test('reads standard input and share links as it reads files', async () => {
    const { printed } = await runOn(MOTOR, 'derive', 'motor');
    const link = String((await runOn(MOTOR, 'link', 'motor')).printed).trim();
    expect((await runOn({ files: {}, standardInput: MOTOR.files.motor }, 'derive', '-')).printed).toBe(printed);
    expect((await runOn({ files: {} }, 'derive', link)).printed).toBe(printed);
    expect((await runOn({ files: {} }, 'derive', `https://example.org/${link}`)).printed).toBe(printed);
  });

  test('keeps the names of derived parameters, and writes them out with --expand', async () => {
    const loop = draw([integrator('x'), gain('g', '-wn2')], ['x -> g', 'g -> x'], { wn2: 'k/m', k: '4', m: '2' });
    const machine = { files: { loop: JSON.stringify(loop) } };
    expect(json(await runOn(machine, 'derive', 'loop'))).toMatchObject({ symbolic: { A: [['-wn2']] } });
    expect(json(await runOn(machine, 'derive', 'loop', '--expand'))).toMatchObject({ symbolic: { A: [['-k/m']] } });
  });

  test('reduces to the fewest states with --minimal, and prints the change of state', async () => {
    const lead = draw(
      [input('u'), output('y'), integrator('x'), integrator('aside')],
      ['u -> x', 'x -> y', 'x -> aside'],
    );
    const machine = { files: { lead: JSON.stringify(lead) } };
    expect(json(await runOn(machine, 'derive', 'lead'))).toMatchObject({ states: ['x', 'aside'], observable: false });
    expect(json(await runOn(machine, 'derive', 'lead', '--minimal'))).toMatchObject({
      states: ['x'],
      observable: true,
      minimal: { of: ['x', 'aside'], change: [['1', '0']] },
    });
  });

  test('says where the general expression divides by zero', async () => {
    const lag = draw(
      [input('u'), sum('e', '+-'), output('y'), differentiator('d'), gain('g', 'L')],
      ['u -> e', 'e -> y', 'e -> d', 'd -> g', 'g -> e:1'],
      { L: '0' },
    );
    const outcome = json(await runOn({ files: { lag: JSON.stringify(lag) } }, 'derive', 'lag'));
    expect(outcome).toMatchObject({ states: [], D: [[1]], symbolic: null });
    expect(outcome['warnings']).toContainEqual({
      code: 'expression-undefined',
      blocks: [],
      message:
        'The general expressions divide by L, which is zero at the present values, so the numbers were derived on their own. ' +
        'In general the states are d; here they are none.',
    });
  });

  test('takes parameters from --set', async () => {
    const machine = { files: { loop: drawingOf('biproper-loop-refused') } };
    const [variant] = referenceCase('biproper-loop-refused').variants ?? [];
    const { A, B, C, D, exact, poles, zeros, stability } = Object(variant?.expect);
    const outcome = await runOn(machine, 'derive', 'loop', '--set', 'g=1', '--set', 'g = 1/2');
    expect(outcome).toMatchObject({ status: 0, complaints: [] });
    expect(json(outcome)).toMatchObject({ A, B, C, D, exact, poles, zeros, stability });
  });

  test('refuses to set what the drawing does not have, and what is no expression', async () => {
    const machine = { files: { loop: drawingOf('biproper-loop-refused') } };
    const told = async (setting: string) => (await runOn(machine, 'derive', 'loop', '--set', setting)).complaints;
    expect(await told('gain=1')).toEqual(['poleward: unknown-parameter: The drawing has no parameter gain. It has g.']);
    expect(await told('G=1')).toEqual(['poleward: unknown-parameter: The drawing has no parameter G. Did you mean g?']);
    expect(await told('g=2 3')).toHaveLength(1);
    expect((await told('g=2 3'))[0]).toMatch(/^poleward: bad-expression: Parameter g: /);
  });

  test('writes to --out instead of printing', async () => {
    const outcome = await runOn(MOTOR, 'derive', 'motor', '--as', 'npz', '--out', 'motor.npz');
    expect(outcome).toMatchObject({ status: 0, printed: '', complaints: [] });
    expect(outcome.written.get('motor.npz')).toBeInstanceOf(Uint8Array);
  });

  test('keeps bytes away from a terminal', async () => {
    const onTerminal = { ...MOTOR, isTerminal: true };
    expect(await runOn(onTerminal, 'derive', 'motor', '--as', 'npz')).toMatchObject({
      status: 2,
      printed: '',
      complaints: [
        "poleward: bad-option: NumPy archive is no text for a terminal. Write --out and a file's path after it.",
      ],
    });
    expect((await runOn(onTerminal, 'derive', 'motor', '--as', 'npz', '--out', 'a')).status).toBe(0);
    expect((await runOn(MOTOR, 'derive', 'motor', '--as', 'npz')).printed).toBeInstanceOf(Uint8Array);
  });

  test('writes fractions or decimals as told', async () => {
    const text = async (...options: string[]) =>
      String((await runOn(MOTOR, 'derive', 'motor', '--as', 'text', ...options)).printed);
    expect(await text()).toContain('-50/3');
    expect(await text('--notation', 'decimals')).toContain('-16.666666666666668');
  });

  test('says warnings beside a format that cannot hold them, and leaves them in the model file', async () => {
    const beside = await runOn(OPEN_PORT, 'derive', 'open', '--as', 'csv');
    expect(beside.status).toBe(0);
    expect(beside.complaints).toHaveLength(2);
    expect(beside.complaints.every(line => line.startsWith('poleward: port-not-connected: '))).toBe(true);
    const inside = await runOn(OPEN_PORT, 'derive', 'open');
    expect(inside.complaints).toEqual([]);
    expect(json(inside)['warnings']).toHaveLength(2);
  });

  test('prints the drawing itself, parameters set, whether it has a model or not', async () => {
    const machine = { files: { loop: drawingOf('biproper-loop-refused') } };
    const outcome = await runOn(machine, 'derive', 'loop', '--as', 'diagram', '--set', 'g=3/4');
    expect(outcome).toMatchObject({ status: 0, complaints: [] });
    expect(json(outcome)['parameters']).toEqual([{ name: 'g', value: '3/4', unit: '1', note: 'loop gain' }]);
  });

  test.each([
    'biproper-loop-refused',
    'differentiated-input-refused',
    'pd-command-output-refused',
    'two-half-loops-refused',
    'unit-loop-by-fractions-refused',
    'unity-loop-gain-refused',
  ])('ends with status 3 and one line where there is no model: %s', async name => {
    const expected = Object(referenceCase(name).expect['error']);
    const machine = { files: { drawing: drawingOf(name) } };
    for (const command of ['derive', 'check']) {
      const { status, printed, complaints } = await runOn(machine, command, 'drawing');
      expect({ status, printed, lines: complaints.length }).toEqual({ status: 3, printed: '', lines: 1 });
      const [line = ''] = complaints;
      expect(line).toMatch(/^poleward: (loop-without-solution|derivative-of-input): [^\n]+$/);
      for (const word of expected.words) expect(line).toContain(word);
      expect(expected.blocks.some((block: string) => line.includes(block))).toBe(true);
    }
  });
});

describe('check', () => {
  test('prints nothing where all is well', async () => {
    expect(await runOn(MOTOR, 'check', 'motor')).toMatchObject({ status: 0, printed: '', complaints: [] });
  });

  test('prints warnings one a line, and they are no failure', async () => {
    const { status, printed, complaints } = await runOn(OPEN_PORT, 'check', 'open');
    expect({ status, complaints }).toEqual({ status: 0, complaints: [] });
    expect(String(printed)).toMatch(/^(poleward: port-not-connected: [^\n]+\n){2}$/);
  });

  test('names a pole that no transfer function shows', async () => {
    const machine = { files: { hidden: drawingOf('hidden-unstable-mode-uncontrollable') } };
    expect(String((await runOn(machine, 'check', 'hidden')).printed)).toMatch(/^poleward: hidden-mode: [^\n]+\n$/m);
  });

  test('says each error of a drawing that cannot be used on a line of its own', async () => {
    const diagram = JSON.parse(drawingOf('biproper-loop-refused'));
    diagram.blocks[2].gain = '2 g';
    diagram.wires[0].from = ['nowhere', 0];
    const outcome = await runOn({ files: { bad: JSON.stringify(diagram) } }, 'check', 'bad');
    expect(outcome.status).toBe(2);
    expect(outcome.complaints.length).toBeGreaterThan(0);
    for (const line of outcome.complaints) expect(line).toMatch(/^poleward: [a-z-]+: [^\n]+$/);
  });
});

describe('link', () => {
  test('prints a fragment that is read back as the drawing', async () => {
    const { status, printed } = await runOn(MOTOR, 'link', 'motor');
    expect(status).toBe(0);
    expect(String(printed)).toMatch(/^#d1=[A-Za-z0-9_-]+\n$/);
    expect(decodeLink(String(printed))).toMatchObject({
      ok: true,
      value: { title: 'Permanent-magnet motor with position' },
    });
  });
});

describe('without a drawing', () => {
  test('--version prints the version and --help every format and the caution', async () => {
    expect((await runOn({ files: {} }, '--version')).printed).toBe(`${packageFile.version}\n`);
    const { status, printed } = await runOn({ files: {} }, '--help');
    expect(status).toBe(0);
    for (const id of ['model', 'csv', 'matrix-market', 'npz', 'latex', 'mathml', 'text', 'diagram']) {
      expect(String(printed)).toMatch(new RegExp(`^ {4}${id} {2,}\\S`, 'm'));
    }
    expect(String(printed)).toContain(CAUTION);
  });

  test('an option that is wrong is told before anything is read', async () => {
    expect(await runOn({ files: {} }, 'derive', 'gone', '--as', 'nothing')).toMatchObject({ status: 2, printed: '' });
  });

  test('a file that is not there ends with status 2', async () => {
    expect(await runOn({ files: {} }, 'derive', 'gone')).toMatchObject({
      status: 2,
      complaints: ['poleward: not-readable: gone: gone.'],
    });
  });
});

test('an empty sheet is a drawing with empty matrices', async () => {
  const diagram = { format: 'poleward-diagram', version: 1, title: '', parameters: [], blocks: [], wires: [] };
  const outcome = await runOn({ files: { empty: JSON.stringify(diagram) } }, 'derive', 'empty');
  expect(outcome.status).toBe(0);
  expect(json(outcome)).toMatchObject({ A: [], B: [], C: [], D: [], controllable: true, observable: true });
});

test('a name with a line break or an escape stays on the line of its message', async () => {
  const diagram = JSON.parse(drawingOf('biproper-loop-refused'));
  diagram.blocks[2].gain = 'g\n*\u001b[31m';
  const { complaints } = await runOn({ files: { odd: JSON.stringify(diagram) } }, 'derive', 'odd');
  expect(complaints.length).toBeGreaterThan(0);
  for (const line of complaints) expect(line).toMatch(/^[^\p{Cc}]*$/u);
});
