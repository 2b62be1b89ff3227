/** The model file of each reference case, from the drawing's text to the file's: what a script outside the project reads. */

import { describe, expect, test } from 'vitest';
import { main } from '../../src/cli/main.ts';
import type { ModelFile } from '../../src/deliver/index.ts';
import { writeDiagram } from '../../src/diagram/index.ts';
import { ok } from '../../src/problem/index.ts';
import { type ExpectedRoot, isWithin, readSituations, type Situation } from './read-cases.ts';

/** Exit status, what was printed and what was said of `derive -` with this drawing. */
async function derive({ diagram }: Situation): Promise<{ status: number; printed: string; said: string }> {
  let printed = '';
  let said = '';
  const status = await main(['derive', '-'], {
    isTerminal: false,
    readFile: async () => ok(''),
    readStandardInput: async () => ok(writeDiagram(diagram)),
    print: async content => {
      printed += String(content);
    },
    complain: line => {
      said += `${line}\n`;
    },
    replaceFile: async () => ok(null),
  });
  return { status, printed, said };
}

const situations = readSituations();
const EXACT_KEYS = ['states', 'inputs', 'outputs', 'exact', 'stability', 'controllable', 'observable', 'initialState'];

describe.each(situations.filter(({ expect: expected }) => expected.error === undefined))('$name', situation => {
  const { expect: expected, tolerance } = situation;

  test('the file says what the source says', async () => {
    const { status, printed, said } = await derive(situation);
    expect({ status, said }).toEqual({ status: 0, said: '' });
    const file: ModelFile & Record<string, unknown> = JSON.parse(printed);
    for (const key of EXACT_KEYS.filter(name => expected[name] !== undefined)) expect(file[key]).toEqual(expected[key]);
    for (const key of ['poles', 'zeros'] as const) expectRoots(file[key], expected[key], key);
    expected.transferFunctions?.forEach((wanted, i) => {
      const { input, output, numerator, denominator } = file.transferFunctions?.[i] ?? {};
      expect([input, output]).toEqual([wanted.input, wanted.output]);
      expectNear(numerator, wanted.numerator, 'transferFunctions');
      expectNear(denominator, wanted.denominator, 'transferFunctions');
    });
    const found = file.warnings.map(({ code, blocks }) => ({ code, blocks }));
    for (const warning of expected.warnings ?? []) expect(found).toContainEqual(warning);
    expect(file.selfCheck.passed).toBe(true);
  });

  function expectNear(found: readonly number[] | undefined, wanted: readonly number[], key: string): void {
    expect(found).toHaveLength(wanted.length);
    expect(wanted.filter((value, i) => !isWithin(found?.[i] ?? Number.NaN, value, tolerance(key)))).toEqual([]);
  }

  function expectRoots(found: ModelFile['poles'], wanted: readonly ExpectedRoot[] | undefined, key: string): void {
    if (wanted === undefined) return;
    expect(found?.map(({ multiplicity }) => multiplicity)).toEqual(wanted.map(({ multiplicity }) => multiplicity));
    const { absolute, relative } = tolerance(key);
    const isFar = (root: ExpectedRoot, i: number) =>
      !(
        Math.hypot((found?.[i]?.re ?? Number.NaN) - root.re, (found?.[i]?.im ?? Number.NaN) - root.im) <=
        absolute + relative * Math.hypot(root.re, root.im)
      );
    expect(wanted.filter(isFar)).toEqual([]);
  }
});

test.each(situations.filter(({ expect: expected }) => expected.error !== undefined))(
  '$name: the refusal has its exit status and names a block',
  async situation => {
    const { status, printed, said } = await derive(situation);
    const { exitStatus, words, blocks } = situation.expect.error ?? { exitStatus: 0, words: [], blocks: [] };
    expect({ status, printed, lines: said.split('\n').length }).toEqual({ status: exitStatus, printed: '', lines: 2 });
    for (const word of words) expect(said).toContain(word);
    expect(blocks.some(block => said.includes(block))).toBe(true);
  },
);
