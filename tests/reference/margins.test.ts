/** Published and hand-worked loops with their margins, and frequency responses with true dead time. */

import { describe, expect, test } from 'vitest';
import { toFraction } from '../../src/algebra/index.ts';
import { type LoopTransfer, loopTransfer, type Margins, margins } from '../../src/analysis/index.ts';
import { compile, directResponse } from '../../src/compile/index.ts';
import type { Diagram, PortReference } from '../../src/diagram/index.ts';
import { isWithin, type Situation, situationsWith } from './read-cases.ts';

interface ExpectedMargins {
  readonly cut: { readonly from: PortReference; readonly to: PortReference };
  readonly gainCrossover?: number | null;
  readonly phaseMarginDeg?: number | null;
  readonly delayMargin?: number | null;
  readonly phaseCrossover?: number | null;
  readonly gainMargin?: number | null;
  readonly loop?: { readonly numeratorExact: readonly string[]; readonly denominatorExact: readonly string[] };
}

const expected = ({ expect: asserted }: Situation) => asserted['margins'] as ExpectedMargins;

function loopOf({ diagram }: Situation, to: PortReference): LoopTransfer {
  const found = loopTransfer(diagram, to);
  if (!found.ok) throw new Error(found.problems.map(({ message }) => message).join(' '));
  return found.value;
}

describe.each(situationsWith('margins'))('$name', situation => {
  const wanted = expected(situation);
  const loop = loopOf(situation, wanted.cut.to);
  const found: Margins = margins(loop);
  const first = found.phaseCrossovers[0] ?? null;

  const figures = [
    ['the gain crossover', wanted.gainCrossover, found.phaseMargin?.omega ?? null],
    ['the phase margin', wanted.phaseMarginDeg, found.phaseMargin?.phaseMargin ?? null],
    ['the delay margin', wanted.delayMargin, found.delayMargin?.seconds ?? null],
    ['the phase crossover', wanted.phaseCrossover, first?.omega ?? null],
    ['the gain margin', wanted.gainMargin, first?.gainMargin ?? null],
  ] as const;

  test.each(figures.filter(([, value]) => value !== undefined))('%s', (_, value, computed) => {
    if (value === null) return expect(computed).toBeNull();
    expect(isWithin(computed ?? NaN, value ?? NaN, situation.tolerance('margins')), `${computed} for ${value}`).toBe(
      true,
    );
  });
});

const withLoop = situationsWith('margins').filter(situation => expected(situation).loop !== undefined);

test.each(withLoop)('$name: the loop transfer as exact coefficients', situation => {
  const { cut, loop: wanted } = expected(situation);
  const { exact } = loopOf(situation, cut.to);
  expect(exact?.numerator.map(toFraction)).toEqual(wanted?.numeratorExact);
  expect(exact?.denominator.map(toFraction)).toEqual(wanted?.denominatorExact);
});

interface ExpectedFrequency {
  readonly input: string;
  readonly output: string;
  readonly w: readonly number[];
  readonly re: readonly number[];
  readonly im: readonly number[];
}

const named = (diagram: Diagram, kind: 'input' | 'output', wanted: string) =>
  diagram.blocks.filter(block => block.kind === kind).findIndex(({ id, name }) => (name ?? id) === wanted);

test.each(situationsWith('frequency'))('$name: its frequency responses by the raw equations', situation => {
  const { diagram, expect: asserted } = situation;
  expect(compile(diagram).ok).toBe(true);
  const direct = directResponse(diagram);
  if (!direct.ok) throw new Error('no direct response');
  for (const wanted of [asserted['frequency']].flat() as readonly ExpectedFrequency[]) {
    wanted.w.forEach((w, k) => {
      const at = direct.value.at({ re: 0, im: w }, named(diagram, 'input', wanted.input));
      const value = at?.[named(diagram, 'output', wanted.output)];
      const tolerance = situation.tolerance('frequency');
      expect(isWithin(value?.re ?? NaN, wanted.re[k] ?? NaN, tolerance), `re at ${w}: ${value?.re}`).toBe(true);
      expect(isWithin(value?.im ?? NaN, wanted.im[k] ?? NaN, tolerance), `im at ${w}: ${value?.im}`).toBe(true);
    });
  }
});
