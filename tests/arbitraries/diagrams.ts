/** Generators of drawings that are valid by construction, of edits to them, and of files with something wrong in them. */

import fc from 'fast-check';
import {
  type Annotation,
  type Block,
  type Diagram,
  type Edit,
  type Parameter,
  type PortReference,
  portCounts,
  type Sheet,
  type Wire,
} from '../../src/diagram/index.ts';

/** Names of the parameters that every generated drawing has; later ones may use earlier ones. */
const PARAMETER_NAMES = ['a', 'b', 'K_p', 'omega'] as const;

const quantity = fc.constantFrom('1', '-1/2', '2.5e-3', 'a', '2*a + b', 'K_p/(1 + a^2)', 'sqrt(omega^2)', '-(b)');
const polynomial = fc.constantFrom('1', 's + 1', 'a*s^2 + b*s + 1', '(s + K_p)*(s + 2)');

const parameters: fc.Arbitrary<readonly Parameter[]> = fc
  .tuple(fc.integer({ min: 1, max: 9 }), fc.boolean(), fc.boolean())
  .map(([value, hasUnit, hasTolerance]) =>
    PARAMETER_NAMES.map((name, i) => ({
      name,
      value: i === 0 ? String(value) : `${PARAMETER_NAMES[i - 1]} + ${i}/7`,
      ...(hasUnit ? { unit: 'N*m' } : {}),
      ...(hasTolerance && i > 0 ? { tolerance: i === 1 ? '10 %' : 'a/10' } : {}),
    })),
  );

/** A block without id, name and place. */
type Body = Block extends infer B ? (B extends Block ? Omit<B, 'id' | 'name' | 'at'> : never) : never;

const matrix = (rows: number, columns: number) =>
  fc.array(fc.array(quantity, { minLength: columns, maxLength: columns }), { minLength: rows, maxLength: rows });

const stateModel: fc.Arbitrary<Body> = fc
  .tuple(fc.nat({ max: 2 }), fc.nat({ max: 2 }), fc.nat({ max: 2 }))
  .chain(([n, m, p]) => fc.tuple(matrix(n, n), matrix(n, m), matrix(p, n), matrix(p, m)))
  .map(([A, B, C, D]) => ({ kind: 'state-model', A, B, C, D }));

const simpleBody: fc.Arbitrary<Body> = fc.oneof(
  fc.constant<Body>({ kind: 'input', unit: 'N' }),
  fc.constant<Body>({ kind: 'output' }),
  quantity.map((gain): Body => ({ kind: 'gain', gain })),
  fc.stringMatching(/^[+-]{1,4}$/).map((signs): Body => ({ kind: 'summer', signs })),
  fc
    .option(quantity, { nil: undefined })
    .map((initial): Body => ({ kind: 'integrator', ...(initial === undefined ? {} : { initial }) })),
  fc
    .tuple(polynomial, polynomial)
    .map(([numerator, denominator]): Body => ({ kind: 'transfer-function', numerator, denominator })),
  fc.integer({ min: 1, max: 10 }).map((order): Body => ({ kind: 'delay', time: '0.1*a', order })),
  fc.constant<Body>({ kind: 'differentiator' }),
  fc.constant<Body>({ kind: 'limiter', lower: '-K_p', upper: 'K_p' }),
  stateModel,
);

interface Recipe {
  readonly bodies: readonly Body[];
  readonly places: readonly (readonly [number, number] | null)[];
  readonly named: readonly boolean[];
  /** For each input port in turn: which output port feeds it, modulo their number; none where it divides by three. */
  readonly picks: readonly number[];
  /** What ids and names of this sheet begin with. */
  readonly prefix: string;
}

function recipe(body: fc.Arbitrary<Body>, prefix: string): fc.Arbitrary<Recipe> {
  const place = fc.option(
    fc
      .tuple(fc.integer({ min: -50, max: 50 }), fc.integer({ min: -50, max: 50 }))
      .map(([x, y]) => [20 * x, 20 * y] as const),
  );
  return fc.record({
    bodies: fc.array(body, { maxLength: 8 }),
    places: fc.array(place, { minLength: 8, maxLength: 8 }),
    named: fc.array(fc.boolean(), { minLength: 8, maxLength: 8 }),
    picks: fc.array(fc.nat({ max: 30 }), { minLength: 24, maxLength: 24 }),
    prefix: fc.constant(prefix),
  });
}

function sheetOf({ bodies, places, named, picks, prefix }: Recipe): Sheet {
  const blocks = bodies.map((body, i): Block => {
    const at = places[i];
    return {
      ...body,
      id: `${prefix}${i}`,
      ...(named[i] === true ? { name: `${prefix} name ${i}` } : {}),
      ...(at === null || at === undefined ? {} : { at }),
    } as Block; // a body with an id is a block
  });
  const outputs = blocks.flatMap(block =>
    Array.from({ length: portCounts(block).outputs }, (_, port): PortReference => [block.id, port]),
  );
  const inputs = blocks.flatMap(block =>
    Array.from({ length: portCounts(block).inputs }, (_, port): PortReference => [block.id, port]),
  );
  const wires = inputs.flatMap((to, i): Wire[] => {
    const pick = picks[i % picks.length] ?? 0;
    const from = outputs[pick % Math.max(1, outputs.length)];
    if (from === undefined || pick % 3 === 0) return [];
    return [
      { from, to, ...(pick % 5 === 1 ? { name: `signal ${i}` } : {}), ...(pick % 7 === 1 ? { via: [[pick, 0]] } : {}) },
    ];
  });
  const annotations = picks.slice(0, (picks[0] ?? 0) % 3).map(
    (pick, i): Annotation => ({
      id: `${prefix}note${i}`,
      kind: pick % 2 === 0 ? 'frame' : 'text',
      at: [pick - 9, 20 * pick],
      size: [40 + pick, 20 + 20 * pick],
      text: pick % 4 === 0 ? '' : `the ${pick} of K_p`,
    }),
  );
  return { blocks, wires, ...(annotations.length === 0 ? {} : { annotations }) };
}

const innerSheet = recipe(simpleBody, 'in').map(sheetOf);
const group = (sheet: fc.Arbitrary<Sheet>) => sheet.map((inner): Body => ({ kind: 'group', sheet: inner }));
const middleSheet = recipe(fc.oneof({ weight: 6, arbitrary: simpleBody }, group(innerSheet)), 'mid').map(sheetOf);
const topSheet = recipe(fc.oneof({ weight: 6, arbitrary: simpleBody }, group(middleSheet)), 'b').map(sheetOf);

/** Drawings with every kind of block, groups up to two deep, some ports open, some blocks without a place. */
export const anyDiagram: fc.Arbitrary<Diagram> = fc
  .record({
    sheet: topSheet,
    parameters,
    title: fc.string({ maxLength: 12 }),
    notes: fc.option(fc.string({ minLength: 1 })),
  })
  .map(({ sheet, parameters: list, title, notes }) => ({
    format: 'poleward-diagram',
    version: 1,
    title,
    ...(notes === null ? {} : { notes }),
    parameters: list,
    ...sheet,
  }));

/** Numbers that a wish to edit is made of; what they pick depends on the drawing they meet. */
export interface Wish {
  readonly kind: Edit['kind'];
  readonly isInGroup: boolean;
  readonly picks: readonly [number, number, number, number];
  readonly text: string;
  readonly body: Body;
  readonly isBold: boolean;
}

const KINDS: readonly Edit['kind'][] = [
  ...(['addBlock', 'addBlocks', 'moveBlocks', 'placeBlocks', 'removeBlocks', 'removeBlocksHealing'] as const),
  ...(['mirrorBlocks', 'reorderBlock', 'renameBlock', 'setField', 'setMatrices', 'connect', 'disconnect'] as const),
  ...(['moveWireEnd', 'setVia', 'nameWire', 'insertOnWire', 'addParameter', 'removeParameter'] as const),
  ...(['addAnnotations', 'removeAnnotations', 'moveAnnotations', 'setAnnotation'] as const),
  ...(['renameParameter', 'setParameter', 'reorderParameters', 'setTitleFields'] as const),
];

const FIELD_TEXTS = [
  '',
  '2*a',
  '+-',
  '-',
  '++++-',
  '3',
  's + 1',
  'b0',
  'b name 1',
  'in name 0',
  'x\ny',
  'K_p',
  'sin',
  'c',
];

/** Wishes to edit, about half of them possible. */
export const anyWish: fc.Arbitrary<Wish> = fc.record({
  kind: fc.constantFrom(...KINDS),
  isInGroup: fc.boolean(),
  picks: fc.tuple(fc.nat({ max: 99 }), fc.nat({ max: 99 }), fc.nat({ max: 99 }), fc.nat({ max: 99 })),
  text: fc.constantFrom(...FIELD_TEXTS),
  body: simpleBody,
  isBold: fc.boolean(),
});

const FIELDS = [
  'gain',
  'signs',
  'initial',
  'unit',
  'note',
  'numerator',
  'denominator',
  'time',
  'order',
  'lower',
  'upper',
];
const pickFrom = <T>(items: readonly T[], pick: number): T | undefined => items[pick % Math.max(1, items.length)];

/** The edit that a wish comes to on a drawing. */
export function editOf(wish: Wish, diagram: Diagram): Edit {
  const groups = diagram.blocks.filter(block => block.kind === 'group');
  const chosen = wish.isInGroup ? pickFrom(groups, wish.picks[3]) : undefined;
  const sheet: Sheet = chosen?.kind === 'group' ? chosen.sheet : diagram;
  const at = chosen === undefined ? [] : [chosen.id];
  return drawingEditOf(wish, diagram) ?? sheetEditOf(wish, sheet, at);
}

function drawingEditOf({ kind, picks: [first, second], text }: Wish, diagram: Diagram): Edit | null {
  const name = pickFrom(diagram.parameters, first)?.name ?? 'a';
  switch (kind) {
    case 'addParameter':
      return { kind, parameter: { name: text, value: '1', note: text }, index: second };
    case 'removeParameter':
      return { kind, name };
    case 'renameParameter':
      return { kind, from: name, to: text === '' ? 'fresh' : text };
    case 'setParameter':
      return { kind, name, value: text, tolerance: second % 2 === 0 ? '' : '5 %' };
    case 'reorderParameters':
      return { kind, names: [name] };
    case 'setTitleFields':
      return { kind, title: text, author: text };
    default:
      return null;
  }
}

function sheetEditOf(wish: Wish, sheet: Sheet, at: readonly string[]): Edit {
  const [first, second, third] = wish.picks;
  const { text, isBold } = wish;
  const ids = sheet.blocks.map(({ id }) => id);
  const id = pickFrom(ids, first) ?? 'b0';
  const other = pickFrom(ids, second) ?? 'b0';
  const to = pickFrom(sheet.wires, first)?.to ?? [id, 0];
  const from: PortReference = [other, third % 2];
  const block = { ...wish.body, id: isBold ? `new${first}` : id } as Block; // a body with an id is a block
  switch (wish.kind) {
    case 'addBlock':
      return { kind: 'addBlock', at, block };
    case 'addBlocks':
      return { kind: 'addBlocks', at, blocks: sheet.blocks.slice(first % 4), wires: sheet.wires, dx: 20, dy: 40 };
    case 'moveBlocks':
      return { kind: 'moveBlocks', at, ids: [id, other], dx: 20 * third, dy: -20 };
    case 'placeBlocks':
      return { kind: 'placeBlocks', at, places: [[id, [20 * third, isBold ? 0 : 2e6]]] };
    case 'removeBlocks':
    case 'removeBlocksHealing':
    case 'mirrorBlocks':
      return { kind: wish.kind, at, ids: isBold ? [id, other] : [id] };
    case 'reorderBlock':
      return { kind: 'reorderBlock', at, id, before: isBold ? null : other };
    case 'renameBlock':
      return { kind: 'renameBlock', at, id, name: text };
    case 'setField':
      return { kind: 'setField', at, id, field: pickFrom(FIELDS, second) ?? 'gain', value: text };
    case 'setMatrices': {
      const size = third % 3;
      const row = Array.from({ length: size }, () => '1');
      const square = row.map(() => row);
      return { kind: 'setMatrices', at, id, A: square, B: square, C: square, D: isBold ? square : [] };
    }
    case 'connect':
      return { kind: 'connect', at, from, to: [id, second % 3], replace: isBold, name: text };
    case 'disconnect':
      return { kind: 'disconnect', at, to };
    case 'moveWireEnd':
      return { kind: 'moveWireEnd', at, to, newFrom: from, newTo: [id, third % 2], replace: isBold };
    case 'setVia':
      return { kind: 'setVia', at, to, via: isBold ? [] : [[third, second]] };
    case 'nameWire':
      return { kind: 'nameWire', at, to, name: text };
    case 'insertOnWire':
      return { kind: 'insertOnWire', at, to, block };
    case 'addAnnotations':
      return { kind: 'addAnnotations', at, annotations: [annotationOf(wish)], dx: 20 * second, dy: 20 };
    case 'removeAnnotations':
      return { kind: 'removeAnnotations', at, ids: annotationIds(sheet, first) };
    case 'moveAnnotations':
      return { kind: 'moveAnnotations', at, ids: annotationIds(sheet, first), dx: isBold ? 2e6 : 20 * second, dy: 0 };
    case 'setAnnotation': {
      const [chosen = 'note'] = annotationIds(sheet, first);
      return { kind: 'setAnnotation', at, id: chosen, text, size: [20 * second, 40 + third] };
    }
    default:
      throw new Error(`${wish.kind} is an edit of the whole drawing`);
  }
}

function annotationOf({ picks: [first, second], text, isBold }: Wish): Annotation {
  return { id: 'note', kind: isBold ? 'frame' : 'text', at: [20 * first, 0], size: [20 + second, 40], text };
}

function annotationIds({ annotations = [] }: Sheet, pick: number): readonly string[] {
  return [pickFrom(annotations, pick)?.id ?? 'note'];
}

/** The object and all that hangs on it, frozen: writing to it throws. */
export function frozen<T>(value: T): T {
  if (typeof value === 'object' && value !== null && !Object.isFrozen(value)) {
    Object.freeze(value);
    for (const part of Object.values(value)) frozen(part);
  }
  return value;
}
