/**
 * Small random drawings for properties: any wiring at all, so with loops of every kind, groups, open ports and several
 * inputs and outputs. Valid as documents; whether they have a model is for the program to say.
 */

import fc from 'fast-check';
import {
  type Block,
  type Diagram,
  type PortReference,
  portCounts,
  type Sheet,
  type Wire,
} from '../../src/diagram/index.ts';

/** What random drawings may hold. */
export interface RandomDrawings {
  readonly blocks: number;
  /** Differentiators and improper transfer functions among the blocks. */
  readonly differentiates?: boolean;
  /** Groups inside one another. */
  readonly depth?: number;
}

const quantity = fc.constantFrom('1', '-1', '2', '-0.5', '3/4', '0.3', '-7/3', '1.25', 'a', 'b/4', '1/(1 + b)');
const polynomial = fc.constantFrom('2', 's + 1', 's/3 + 2', 's^2 + s/2 + 3', '(s + 1)*(s + 2)');
const denominator = fc.constantFrom('s + 2', '2*s + 1', 's^2 + 2*s + 5', '(s + 1)^2*(s + 4)', 's*(s + 3)');

type Body = Block extends infer B ? (B extends Block ? Omit<B, 'id'> : never) : never;

const proper: fc.Arbitrary<Body> = fc
  .tuple(polynomial, denominator)
  .filter(([top, bottom]) => degree(top) <= degree(bottom))
  .map(([top, bottom]): Body => ({ kind: 'transfer-function', numerator: top, denominator: bottom }));

/** Degree of one of the polynomials above, by what it is made of. */
function degree(text: string): number {
  return text.includes('^2*') ? 3 : text.includes('s^2') || /\).*\)|s\*/.test(text) ? 2 : text.includes('s') ? 1 : 0;
}

const matrix = (rows: number, columns: number) =>
  fc.array(fc.array(quantity, { minLength: columns, maxLength: columns }), { minLength: rows, maxLength: rows });

const stateModel: fc.Arbitrary<Body> = fc
  .tuple(fc.integer({ min: 1, max: 2 }), fc.integer({ min: 1, max: 2 }), fc.integer({ min: 1, max: 2 }))
  .chain(([n, m, p]) => fc.tuple(matrix(n, n), matrix(n, m), matrix(p, n), matrix(p, m)))
  .map(([A, B, C, D]): Body => ({ kind: 'state-model', A, B, C, D }));

const body: fc.Arbitrary<Body> = fc.oneof(
  { weight: 4, arbitrary: quantity.map((gain): Body => ({ kind: 'gain', gain })) },
  { weight: 4, arbitrary: fc.stringMatching(/^[+-]{1,3}$/).map((signs): Body => ({ kind: 'summer', signs })) },
  { weight: 3, arbitrary: fc.constant<Body>({ kind: 'integrator' }) },
  { weight: 2, arbitrary: proper },
  { weight: 1, arbitrary: stateModel },
  {
    weight: 1,
    arbitrary: fc.constantFrom<Body>({ kind: 'delay', time: '1/5' }, { kind: 'delay', time: 'a', order: 3 }),
  },
  { weight: 1, arbitrary: fc.constant<Body>({ kind: 'limiter', lower: '-1', upper: '1' }) },
  { weight: 1, arbitrary: fc.constantFrom<Body>({ kind: 'input' }, { kind: 'output' }) },
);

const differentiating: fc.Arbitrary<Body> = fc.oneof(
  { weight: 6, arbitrary: body },
  { weight: 1, arbitrary: fc.constant<Body>({ kind: 'differentiator' }) },
  {
    weight: 1,
    arbitrary: fc.constantFrom<Body>(
      { kind: 'transfer-function', numerator: 's/2 + 1', denominator: '1' },
      { kind: 'transfer-function', numerator: 's^2 + 1', denominator: 's + 3' },
    ),
  },
);

/** Drawings as the options say, with the parameters a and b. */
export function randomDrawings(options: RandomDrawings): fc.Arbitrary<Diagram> {
  return sheets(options, options.depth ?? 0, true).map(sheet => ({
    format: 'poleward-diagram',
    version: 1,
    title: 'Random drawing',
    parameters: [
      { name: 'a', value: '0.7' },
      { name: 'b', value: '1/3' },
    ],
    ...sheet,
  }));
}

function sheets(options: RandomDrawings, depth: number, isTop: boolean): fc.Arbitrary<Sheet> {
  const simple = options.differentiates === true ? differentiating : body;
  const groups = (): fc.Arbitrary<Body> =>
    sheets(options, depth - 1, false).map((sheet): Body => ({ kind: 'group', sheet }));
  const anyBody = depth > 0 ? fc.oneof({ weight: 5, arbitrary: simple }, { weight: 1, arbitrary: groups() }) : simple;
  const ends: Body[] = [{ kind: 'input' }, { kind: 'output' }];
  return fc
    .array(anyBody, { minLength: 1, maxLength: isTop ? options.blocks : Math.ceil(options.blocks / 2) })
    .chain(bodies => {
      const blocks = [...ends, ...bodies].map((own, i): Block => ({ ...own, id: `${own.kind.charAt(0)}${i}` }));
      return wiring(blocks).map((wires): Sheet => ({ blocks, wires }));
    });
}

/** At most one wire into each input port, from any output port of the sheet; about one in six stays open. */
function wiring(blocks: readonly Block[]): fc.Arbitrary<readonly Wire[]> {
  const sources = blocks.flatMap(block => portsOf(block, portCounts(block).outputs));
  const targets = blocks.flatMap(block => portsOf(block, portCounts(block).inputs));
  const choice = fc.integer({ min: -Math.ceil(sources.length / 5), max: sources.length - 1 });
  return fc.array(choice, { minLength: targets.length, maxLength: targets.length }).map(choices =>
    targets.flatMap((to, i): Wire[] => {
      const from = sources[choices[i] ?? -1];
      return from === undefined ? [] : [{ from, to }];
    }),
  );
}

function portsOf({ id }: Block, count: number): PortReference[] {
  return Array.from({ length: count }, (_, port): PortReference => [id, port]);
}
