import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Rational, rational, rationalField, toRows, ZERO } from '../../../src/algebra/index.ts';
import { compile } from '../../../src/compile/index.ts';
import { exactWorkings, type WorkingLine } from '../../../src/compile/workings/index.ts';
import type { Diagram } from '../../../src/diagram/index.ts';
import { randomDrawings } from '../../arbitraries/random-drawings.ts';
import { SEED } from '../../arbitraries/rationals.ts';

type Line = WorkingLine<Rational>;

const { add, multiply } = rationalField;

function sectionsOf(diagram: Diagram) {
  const workings = exactWorkings(diagram);
  return workings?.field === 'rational' ? workings.sections : null;
}

const sumOf = ({ terms }: Line, valueOf: (name: string) => Rational) =>
  terms.reduce((sum, { coefficient, of }) => add(sum, multiply(coefficient, valueOf(of))), ZERO);

/** What a line has on the left, apart from what has the same name without being differentiated. */
const leftOf = ({ left, isDerivative }: Line) => (isDerivative ? `d ${left}` : left);

for (const differentiates of [false, true]) {
  const kind = differentiates ? 'with' : 'without';
  const drawings = randomDrawings({ blocks: 9, depth: 2, differentiates });

  test(`the last lines are the rows of the model, ${kind} differentiation`, () => {
    let seen = 0;
    fc.assert(
      fc.property(drawings, diagram => {
        const derived = compile(diagram, { field: 'rational' });
        const sections = sectionsOf(diagram);
        if (!derived.ok) return;
        const { model } = derived.value;
        const result = sections?.at(-1);
        if (result === undefined || model.rational === null) throw new Error('a model without workings');
        expect(result.kind).toBe('result');
        const { A, B, C, D } = model.rational;
        const names = [...model.states, ...model.inputs].map(({ name }) => name);
        if (new Set(names).size < names.length) return; // a name of a state and of an input
        seen += 1;
        const upper = toRows(A, ZERO).map((row, i) => [...row, ...(toRows(B, ZERO)[i] ?? [])]);
        const lower = toRows(C, ZERO).map((row, i) => [...row, ...(toRows(D, ZERO)[i] ?? [])]);
        const rows = result.lines.map(line =>
          names.map(name => line.terms.find(({ of }) => of === name)?.coefficient ?? ZERO),
        );
        expect(rows).toEqual([...upper, ...lower]);
        expect(result.lines.map(leftOf)).toEqual([
          ...model.states.map(({ name }) => `d ${name}`),
          ...model.outputs.map(({ name }) => name),
        ]);
      }),
      { seed: SEED, numRuns: 200 },
    );
    expect(seen).toBeGreaterThan(80);
  });

  test(`every line holds at random values of what is known, ${kind} differentiation`, () => {
    let seen = 0;
    fc.assert(
      fc.property(
        drawings,
        fc.array(fc.integer({ min: -99, max: 99 }), { minLength: 7, maxLength: 7 }),
        (diagram, numbers) => {
          const sections = sectionsOf(diagram);
          if (sections === null) return;
          const solved = sections.filter(({ kind: each }) => each === 'solution' || each === 'substitution');
          const values = new Map<string, Rational>();
          const known = (name: string) => {
            const value =
              values.get(name) ?? rational(BigInt((numbers[values.size % numbers.length] ?? 1) + values.size), 7n);
            values.set(name, value);
            return value;
          };
          const signals = new Map(solved.flatMap(({ lines }) => lines).map(line => [line.left, sumOf(line, known)]));
          const valueOf = (name: string) => signals.get(name) ?? known(name);
          const drawn = sections.filter(({ kind: each }) => each === 'drawing' || each === 'loop');
          for (const line of drawn.flatMap(({ lines }) => lines)) {
            const own = line.isDerivative ? undefined : signals.get(line.left);
            if (own === undefined) continue;
            seen += 1;
            expect(sumOf(line, valueOf)).toEqual(own);
          }
          const reduced = sections.find(({ kind: each }) => each === 'differentiation') ?? sections.at(-1);
          const drawnRows = new Map(sections[0]?.lines.map(line => [leftOf(line), line]));
          for (const line of reduced?.lines ?? []) {
            const first = drawnRows.get(leftOf(line));
            if (first === undefined || signals.has(line.left)) continue;
            seen += 1;
            expect(sumOf(line, valueOf)).toEqual(sumOf(first, valueOf));
          }
        },
      ),
      { seed: SEED, numRuns: 200 },
    );
    expect(seen).toBeGreaterThan(500);
  });
}
