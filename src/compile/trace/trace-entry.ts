/** The trace of one entry of the system matrix, from a drawing made ready for it. */

import { type Field, type Rational, rationalField } from '../../algebra/index.ts';
import {
  createSymbolicField,
  type EffortLimits,
  formulaOf,
  formulaText,
  type RationalFunction,
  withinEffort,
} from '../../algebra/symbolic/index.ts';
import type { ActionGraph, Branch } from './action-graph.ts';
import { reachedFrom } from './action-graph.ts';
import { symbolicGains } from './branch-gains.ts';
import { type EntryNodes, nodesOfEntry, whyNotTraceable } from './entry-nodes.ts';
import { type Gain, gainBetween, type Walk } from './gain-formula.ts';
import { type BranchList, LISTING_LIMITS, type ListingLimits, pathsAndLoops } from './paths-and-loops.ts';
import type { EntryPlace, Trace, TracedValue, TracedWalk } from './trace.ts';
import type { TracedDrawing } from './traced-drawing.ts';
import { partsOfWalk, type WireEnd } from './traced-parts.ts';

/** A tenth of a second or less: an entry is traced while the pointer moves. */
const SYMBOL_LIMITS: EffortLimits = { maximumTerms: 1_000, maximumOperations: 200_000 };

/** Characters that are still read in a sentence: some two lines of the results column. */
const LONGEST_FORMULA = 160;

/**
 * Why the entry is what it is. Exact: the value is the model's entry, by the gain formula and not by the elimination that gave
 * the model. Where there are more paths or loops than the limits allow, or where the drawing differentiates in a way that no
 * path shows, the trace says so and still has the blocks and wires.
 */
export function traceEntry(traced: TracedDrawing, place: EntryPlace, limits: ListingLimits = LISTING_LIMITS): Trace {
  const { graph } = traced;
  const entry = nodesOfEntry(traced, place);
  const within = between(graph, entry);
  const ends = { from: entry.from, to: entry.to, ...partsWithin(traced, within, entry) };
  const obstacle = whyNotTraceable(traced, entry);
  if (obstacle !== null) return { outcome: 'not-traced', reason: obstacle, ...ends };
  const listing = pathsAndLoops(graph, entry.source, entry.sink, within, limits);
  if (!listing.complete) return { outcome: 'not-traced', reason: tooMany(listing.met, entry, limits), ...ends };
  const { paths, loops } = listing;
  const numbers = formulaFor(rationalField, ({ gain }) => gain, graph, paths, loops);
  const { value, determinant } = numbers.gain;
  if (determinant?.n === 0n) {
    const reason = `The loops that these paths touch have the determinant zero, so that the paths alone give no value.`;
    return { outcome: 'not-traced', reason, ...ends };
  }
  if (value === null || determinant === null)
    return { outcome: 'not-traced', reason: tooMany('loops', entry, limits), ...ends };
  const symbols = symbolsFor(traced, paths, loops);
  const write = (exact: Rational, text: string | null | undefined): TracedValue => ({ exact, symbols: text ?? null });
  const walk = (list: BranchList, product: Rational, text: string | null | undefined): TracedWalk => ({
    ...describedWalk(traced, list),
    product: write(product, text),
  });
  return {
    outcome: 'traced',
    ...ends,
    value: write(value, symbols?.value),
    determinant: write(determinant, symbols?.determinant),
    paths: paths.map((list, k) => ({
      ...walk(list, numbers.paths[k]!.product, symbols?.paths[k]),
      cofactor: write(numbers.gain.cofactors[k]!, symbols?.cofactors[k]),
    })),
    loops: loops.map((list, k) => walk(list, numbers.loops[k]!.product, symbols?.loops[k])),
  };
}

/** The nodes on some way from the entry's column to its row. */
function between(graph: ActionGraph, { source, sink }: EntryNodes): ReadonlySet<number> {
  if (source < 0 || sink < 0) return new Set();
  const back = reachedFrom(graph, [sink], 'backwards');
  return new Set([...reachedFrom(graph, [source], 'forwards')].filter(node => back.has(node)));
}

function partsWithin(
  { graph, drawing, parts }: TracedDrawing,
  within: ReadonlySet<number>,
  { from, to }: EntryNodes,
): { readonly blocks: readonly string[]; readonly wires: readonly WireEnd[] } {
  const inside = graph.branches.filter(({ from: a, to: b, gain }) => gain.n !== 0n && within.has(a) && within.has(b));
  const own = new Set(inside.map(({ block }) => block));
  const ports = new Set(inside.flatMap(({ port }) => (port === null ? [] : [port])));
  const blocks = drawing.blocks.filter(({ path }, b) => own.has(b) || path === from.block || path === to.block);
  return {
    blocks: blocks.map(({ path }) => path),
    wires: [...ports].sort((a, b) => a - b).map(port => parts.wireInto(port)),
  };
}

interface Formula<T> {
  readonly paths: readonly Walk<T>[];
  readonly loops: readonly Walk<T>[];
  readonly gain: Gain<T>;
}

function formulaFor<T>(
  field: Field<T>,
  gainOf: (branch: Branch) => T,
  { branches }: ActionGraph,
  paths: readonly BranchList[],
  loops: readonly BranchList[],
): Formula<T> {
  const walkOf = (list: BranchList): Walk<T> => ({
    product: list.reduce((product, k) => field.multiply(product, gainOf(branches[k]!)), field.one),
    nodes: new Set(list.flatMap(k => [branches[k]!.from, branches[k]!.to])),
  });
  const own = { paths: paths.map(walkOf), loops: loops.map(walkOf) };
  return { ...own, gain: gainBetween(field, own.paths, own.loops) };
}

interface SymbolTexts {
  readonly value: string | null;
  readonly determinant: string | null;
  readonly paths: readonly (string | null)[];
  readonly loops: readonly (string | null)[];
  readonly cofactors: readonly (string | null)[];
}

/** The same in the parameters; null where the effort is spent. */
function symbolsFor(
  traced: TracedDrawing,
  paths: readonly BranchList[],
  loops: readonly BranchList[],
): SymbolTexts | null {
  const field = createSymbolicField(SYMBOL_LIMITS);
  const declared = traced.diagram.parameters.map(({ name }) => name);
  const written = (f: RationalFunction): string | null => {
    const text = formulaText(formulaOf(f, { declared, effort: field.effort }));
    return text.length > LONGEST_FORMULA ? null : text;
  };
  const optional = (f: RationalFunction | null): string | null => (f === null ? null : written(f));
  const outcome = withinEffort((): SymbolTexts => {
    const formula = formulaFor(field, symbolicGains(traced, field), traced.graph, paths, loops);
    const { value, determinant, cofactors } = formula.gain;
    return {
      value: optional(value),
      determinant: optional(determinant),
      paths: formula.paths.map(({ product }) => written(product)),
      loops: formula.loops.map(({ product }) => written(product)),
      cofactors: cofactors.map(optional),
    };
  });
  return outcome.finished ? outcome.value : null;
}

function describedWalk({ graph, drawing, parts }: TracedDrawing, list: BranchList): Omit<TracedWalk, 'product'> {
  const { blocks, ports } = partsOfWalk(list.map(k => graph.branches[k]!));
  const shown = blocks.filter(b => drawing.blocks[b]!.role !== 'boundary');
  return {
    steps: shown.map(b => parts.stepOf(b)),
    blocks: blocks.map(b => drawing.blocks[b]!.path),
    wires: ports.map(port => parts.wireInto(port)),
  };
}

function tooMany(met: keyof ListingLimits, { from, to }: EntryNodes, { paths, loops }: ListingLimits): string {
  const way = `from ${from.name} to ${to.kind === 'derivative' ? `the derivative of ${to.name}` : to.name}`;
  const what =
    met === 'steps'
      ? 'There are too many ways through the drawing'
      : met === 'paths'
        ? `There are more than ${paths} action paths`
        : `More than ${loops} loops, or too many sets of them, meet the action paths`;
  return `${what} ${way} to list one by one; the blocks and wires on them are marked.`;
}
