/**
 * The shape of each kind of block, field by field. A message says what the field has to be, as the end of the sentence
 * that shape.ts begins: `Gain K: "gain" is not a quantity: text or a finite number.`
 */

import * as v from 'valibot';
import { FARTHEST_PLACE, HIGHEST_DELAY_ORDER, LONGEST_NAME, MOST_SIGNS } from '../limits.ts';
import type { BlockKind } from '../types.ts';

const ID = /^[A-Za-z][A-Za-z0-9_]*$/;
// biome-ignore lint/suspicious/noControlCharactersInRegex: they are what a name must not hold
const PRINTABLE = /^[^\u0000-\u001f\u007f-\u009f\u2028\u2029]*$/;

const QUANTITY = 'a quantity: text or a finite number';
const POINT = `[x, y]: two numbers within ±${FARTHEST_PLACE}`;

/** A legal id. */
export const idSchema = v.pipe(
  v.string('text'),
  v.regex(ID, 'an id: a letter, then letters, digits and underscores'),
  v.maxLength(LONGEST_NAME, `an id of at most ${LONGEST_NAME} characters`),
);

/** Text for people. */
export const textSchema = v.string('text');

/** A name as shown and exported: one line. */
export const nameSchema = v.pipe(
  v.string('text'),
  v.regex(PRINTABLE, 'a name on one line'),
  v.maxLength(LONGEST_NAME, `a name of at most ${LONGEST_NAME} characters`),
);

/** An expression as text; a JSON number means its shortest decimal. */
export const quantitySchema = v.union(
  [
    v.string(),
    v.pipe(
      v.number(),
      v.finite(),
      v.transform(number => String(number)),
    ),
  ],
  QUANTITY,
);

const coordinate = v.pipe(
  v.number(POINT),
  v.minValue(-FARTHEST_PLACE, POINT),
  v.maxValue(FARTHEST_PLACE, POINT),
  v.transform(number => number + 0), // a negative zero would not survive being written
);

/** A place on the sheet. */
export const pointSchema = v.strictTuple([coordinate, coordinate], POINT);

const rowSchema = v.array(quantitySchema, 'a row of quantities: [...]');
const matrixSchema = v.array(rowSchema, 'rows of quantities: [[...], ...]');

const common = {
  id: idSchema,
  at: v.exactOptional(pointSchema),
  name: v.exactOptional(nameSchema),
  mirrored: v.exactOptional(v.boolean('true or false')),
  note: v.exactOptional(textSchema),
};

const unit = v.exactOptional(textSchema);

const ORDER = `a whole number from 1 to ${HIGHEST_DELAY_ORDER}`;
const order = v.pipe(v.number(ORDER), v.integer(ORDER), v.minValue(1, ORDER), v.maxValue(HIGHEST_DELAY_ORDER, ORDER));

const SIGNS = `a string of ${MOST_SIGNS} + and - at most, one at least`;
const signs = v.pipe(v.string(SIGNS), v.regex(new RegExp(`^[+-]{1,${MOST_SIGNS}}$`), SIGNS));

/** The fields of each kind; what else a block holds is passed over. A group's sheet is read apart. */
export const blockSchemas = {
  input: v.object({ ...common, kind: v.literal('input'), unit }),
  output: v.object({ ...common, kind: v.literal('output'), unit }),
  gain: v.object({ ...common, kind: v.literal('gain'), gain: quantitySchema }),
  summer: v.object({ ...common, kind: v.literal('summer'), signs }),
  integrator: v.object({
    ...common,
    kind: v.literal('integrator'),
    initial: v.exactOptional(quantitySchema),
    unit,
  }),
  'transfer-function': v.object({
    ...common,
    kind: v.literal('transfer-function'),
    numerator: quantitySchema,
    denominator: quantitySchema,
  }),
  'state-model': v.object({
    ...common,
    kind: v.literal('state-model'),
    A: matrixSchema,
    B: matrixSchema,
    C: matrixSchema,
    D: matrixSchema,
    initial: v.exactOptional(rowSchema),
  }),
  delay: v.object({ ...common, kind: v.literal('delay'), time: quantitySchema, order: v.exactOptional(order) }),
  differentiator: v.object({ ...common, kind: v.literal('differentiator') }),
  limiter: v.object({ ...common, kind: v.literal('limiter'), lower: quantitySchema, upper: quantitySchema }),
  group: v.object({ ...common, kind: v.literal('group') }),
} as const satisfies Readonly<Record<BlockKind, v.GenericSchema>>;

const PORT = '["block id", port], ports counted from 0';
const portReference = v.strictTuple(
  [v.string(PORT), v.pipe(v.number(PORT), v.integer(PORT), v.minValue(0, PORT))],
  PORT,
);

export const wireSchema = v.object({
  from: portReference,
  to: portReference,
  name: v.exactOptional(nameSchema),
  via: v.exactOptional(v.array(pointSchema, 'bend points: [[x, y], ...]')),
});

export const cutSchema = v.object({ to: portReference, name: v.exactOptional(nameSchema) });

export const parameterSchema = v.object({
  name: textSchema,
  value: quantitySchema,
  unit,
  tolerance: v.exactOptional(v.union([textSchema, quantitySchema], 'an amount, such as "10 %" or "0.2"')),
  note: v.exactOptional(textSchema),
  range: v.exactOptional(v.strictTuple([quantitySchema, quantitySchema], 'two quantities: ["0", "10"]')),
});
