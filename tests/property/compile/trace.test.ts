import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { entryAt, type Rational, toFraction, ZERO } from '../../../src/algebra/index.ts';
import { compile, type StateSpace } from '../../../src/compile/index.ts';
import { entriesOn, type TracedDrawing, traceable, traceEntry } from '../../../src/compile/trace/index.ts';
import { type Diagram, editDiagram } from '../../../src/diagram/index.ts';
import { evaluateParameters, evaluateQuantity } from '../../../src/expression/index.ts';
import { randomDrawings } from '../../arbitraries/random-drawings.ts';
import { SEED } from '../../arbitraries/rationals.ts';

function tracedOf(diagram: Diagram): TracedDrawing | null {
  const derived = compile(diagram, { field: 'rational' });
  if (!derived.ok) return null;
  const traced = traceable(diagram, derived.value.model);
  if (!traced.ok) throw new Error('a derived drawing that cannot be read');
  return traced.value;
}

function entryOf({ states, rational }: StateSpace, row: number, column: number): Rational {
  if (rational === null) throw new Error('derived in doubles');
  const n = states.length;
  const [left, right] = row < n ? [rational.A, rational.B] : [rational.C, rational.D];
  const i = row < n ? row : row - n;
  return column < n ? entryAt(left, i, column, ZERO) : entryAt(right, i, column - n, ZERO);
}

function places({ states, inputs, outputs }: StateSpace): { row: number; column: number }[] {
  return Array.from({ length: states.length + outputs.length }, (_, row) =>
    Array.from({ length: states.length + inputs.length }, (_, column) => ({ row, column })),
  ).flat();
}

/** Fewer than the program lists, so that the longest cases stay short. */
const LIMITS = { paths: 24, loops: 16, steps: 20_000 };

function tally(drawings: fc.Arbitrary<Diagram>, numRuns: number) {
  const count = { traced: 0, withLoops: 0, untraced: 0, nonzero: 0 };
  fc.assert(
    fc.property(drawings, diagram => {
      const traced = tracedOf(diagram);
      if (traced === null) return;
      for (const place of places(traced.model)) {
        const trace = traceEntry(traced, place, LIMITS);
        if (trace.outcome === 'not-traced') {
          count.untraced += 1;
          continue;
        }
        count.traced += 1;
        if (trace.loops.length > 0) count.withLoops += 1;
        if (trace.value.exact.n !== 0n) count.nonzero += 1;
        expect(toFraction(trace.value.exact)).toBe(toFraction(entryOf(traced.model, place.row, place.column)));
      }
    }),
    { seed: SEED, numRuns },
  );
  return count;
}

describe('the trace of an entry', () => {
  test('has exactly the entry’s value, algebraic loops and groups included', () => {
    const count = tally(randomDrawings({ blocks: 10, depth: 2 }), 300);
    expect(count.withLoops).toBeGreaterThan(100);
    expect(count.nonzero).toBeGreaterThan(1000);
    expect(count.untraced).toBeLessThan(count.traced / 10);
  });

  test('has exactly the entry’s value where the drawing differentiates, or says that it cannot', () => {
    const count = tally(randomDrawings({ blocks: 8, depth: 1, differentiates: true }), 2000);
    expect(count.withLoops).toBeGreaterThan(30);
    expect(count.nonzero).toBeGreaterThan(500);
    expect(count.untraced).toBeGreaterThan(30);
  });

  test('says in symbols what it says in numbers', () => {
    let compared = 0;
    fc.assert(
      fc.property(randomDrawings({ blocks: 8, depth: 1 }), diagram => {
        const traced = tracedOf(diagram);
        const scope = evaluateParameters(diagram.parameters);
        if (traced === null || !scope.ok) return;
        for (const place of places(traced.model)) {
          const trace = traceEntry(traced, place, LIMITS);
          if (trace.outcome === 'not-traced' || trace.value.symbols === null) continue;
          const value = evaluateQuantity(trace.value.symbols, scope.value);
          // A general expression may divide by zero at just these values; the number stands then.
          if (!value.ok || value.value.exact === null) continue;
          compared += 1;
          expect(toFraction(value.value.exact)).toBe(toFraction(trace.value.exact));
        }
      }),
      { seed: SEED, numRuns: 120 },
    );
    expect(compared).toBeGreaterThan(500);
  });
});

describe('the entries on a block', () => {
  test('are all that change when a gain does', () => {
    let changed = 0;
    fc.assert(
      fc.property(randomDrawings({ blocks: 9, depth: 0 }), fc.nat(), (diagram, pick) => {
        const gains = diagram.blocks.filter(({ kind }) => kind === 'gain');
        const gain = gains[pick % Math.max(1, gains.length)];
        const traced = tracedOf(diagram);
        if (gain === undefined || traced === null) return;
        const edited = editDiagram(diagram, { kind: 'setField', id: gain.id, field: 'gain', value: '17/3' });
        const other = edited.ok ? tracedOf(edited.value) : null;
        if (other === null) return;
        const marked = new Set(entriesOn(traced, { block: gain.id }).map(({ row, column }) => `${row} ${column}`));
        for (const { row, column } of places(traced.model)) {
          const [before, after] = [entryOf(traced.model, row, column), entryOf(other.model, row, column)];
          if (toFraction(before) === toFraction(after)) continue;
          changed += 1;
          expect(marked.has(`${row} ${column}`)).toBe(true);
        }
      }),
      { seed: SEED, numRuns: 800 },
    );
    expect(changed).toBeGreaterThan(100);
  });
});
