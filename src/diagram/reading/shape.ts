/**
 * A JSON value to a document, by its shape alone: kinds, fields, types and sizes. The stage after json-text.ts; whether wires
 * and names fit together is asked in joining.ts, whether expressions mean anything is asked later still.
 */

import * as v from 'valibot';
import { onOneLine, quote } from '../../expression/index.ts';
import { DEEPEST_GROUP, MOST_BLOCKS, MOST_PARAMETERS, MOST_REQUIREMENTS } from '../limits.ts';
import type { Requirement } from '../requirements/index.ts';
import { KIND_WORDS } from '../titles.ts';
import type { Block, BlockKind, Cut, Diagram, Parameter, Sheet, Wire } from '../types.ts';
import { readAnnotations } from './annotation-shape.ts';
import { blockSchemas, cutSchema, parameterSchema, textSchema, wireSchema } from './block-schemas.ts';
import { note, pathOf, type Reading, type SheetPlace, TOP_SHEET } from './reading.ts';
import { readRequirement } from './requirement-shape.ts';
import { matrixShapeFault } from './state-model-shape.ts';
import { whatIsWrong } from './wording.ts';

type Fields = Readonly<Record<string, unknown>>;

const isFields = (value: unknown): value is Fields =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const own = (fields: Fields, key: string): unknown => (Object.hasOwn(fields, key) ? fields[key] : undefined);

/** The document, or null with the problems noted. */
export function readShape(value: unknown, reading: Reading): Diagram | null {
  if (!isFields(value) || own(value, 'format') !== 'poleward-diagram') {
    note(reading, 'not-a-diagram', otherFormat(value));
    return null;
  }
  if (own(value, 'version') !== 1) {
    note(reading, 'wrong-version', wrongVersion(own(value, 'version')));
    return null;
  }
  const texts = readTexts(value, reading);
  const parameters = readParameters(own(value, 'parameters'), reading);
  const sheet = readSheet(value, TOP_SHEET, reading);
  const cuts = readCuts(own(value, 'cuts') ?? [], reading);
  const requirements = readRequirements(own(value, 'requirements') ?? [], reading);
  if (sheet === null || reading.problems.length > 0) return null;
  return {
    format: 'poleward-diagram',
    version: 1,
    ...texts,
    parameters,
    ...sheet,
    ...(cuts.length === 0 ? {} : { cuts }),
    ...(requirements.length === 0 ? {} : { requirements }),
  };
}

function otherFormat(value: unknown): string {
  if (isFields(value) && own(value, 'format') === 'poleward-model') {
    return 'This is a model file, not a drawing. Open the *.poleward.json file it was made from.';
  }
  return 'This is no Poleward diagram: its "format" is not "poleward-diagram". Open a *.poleward.json file.';
}

function wrongVersion(version: unknown): string {
  const found = typeof version === 'number' || typeof version === 'string' ? quote(String(version)) : 'no version';
  const has = found === 'no version' ? found : `version ${found}`;
  return `The diagram has ${has}, this program reads version 1. Open it with a newer program.`;
}

const TEXTS = ['title', 'notes', 'revision', 'date', 'author'] as const;

function readTexts(fields: Fields, reading: Reading): Pick<Diagram, (typeof TEXTS)[number]> {
  const texts: { -readonly [K in (typeof TEXTS)[number]]?: string } = {};
  for (const key of TEXTS) {
    const value = own(fields, key);
    if (value === undefined || value === '') continue;
    const parsed = v.safeParse(textSchema, value);
    if (parsed.success) texts[key] = parsed.output;
    else note(reading, 'bad-value', `The diagram: "${key}" is not text.`);
  }
  return { ...texts, title: texts.title ?? '' };
}

function readParameters(value: unknown, reading: Reading): readonly Parameter[] {
  const items = readList(value ?? [], 'The diagram: "parameters" is not a list.', reading);
  if (items.length > MOST_PARAMETERS) {
    note(reading, 'too-large', `The diagram has ${items.length} parameters, ${MOST_PARAMETERS} at most are read.`);
    return [];
  }
  return items.flatMap((item, i) => {
    const parsed = v.safeParse(parameterSchema, item);
    if (parsed.success) return [withoutBlanks(parsed.output, ['unit', 'tolerance', 'note'])];
    const name = isFields(item) ? own(item, 'name') : undefined;
    const title =
      typeof name === 'string' && name !== '' ? `Parameter ${onOneLine(name)}` : `The parameter at place ${i + 1}`;
    note(reading, 'bad-value', `${title}: ${whatIsWrong(parsed.issues[0])}`);
    return [];
  });
}

function readCuts(value: unknown, reading: Reading): readonly Cut[] {
  return readList(value, 'The diagram: "cuts" is not a list.', reading).flatMap((item, i) => {
    const parsed = v.safeParse(cutSchema, item);
    if (parsed.success) return [withoutBlanks(parsed.output, ['name'])];
    note(reading, 'bad-value', `The cut at place ${i + 1}: ${whatIsWrong(parsed.issues[0])}`);
    return [];
  });
}

function readRequirements(value: unknown, reading: Reading): readonly Requirement[] {
  const items = readList(value, 'The diagram: "requirements" is not a list.', reading);
  if (items.length > MOST_REQUIREMENTS) {
    note(reading, 'too-large', `The diagram has ${items.length} requirements, ${MOST_REQUIREMENTS} at most are read.`);
    return [];
  }
  return items.flatMap((item, i) => {
    const { requirement, fault } = readRequirement(item);
    if (requirement !== null) return [requirement];
    note(reading, 'bad-value', `The requirement at place ${i + 1}: ${fault}`);
    return [];
  });
}

function readList(value: unknown, message: string, reading: Reading): readonly unknown[] {
  if (Array.isArray(value)) return value;
  note(reading, 'bad-value', message);
  return [];
}

/** Recursion is as deep as groups are: at most 32. */
function readSheet(fields: Fields, place: SheetPlace, reading: Reading): Sheet | null {
  const title = place.names.length === 0 ? 'The diagram' : `Group ${place.names.join('.')}`;
  const items = readList(own(fields, 'blocks'), `${title}: "blocks" is not a list.`, reading);
  const before = reading.blocks;
  reading.blocks += items.length;
  if (reading.blocks > MOST_BLOCKS) {
    if (before <= MOST_BLOCKS) note(reading, 'too-large', `The diagram has more than ${MOST_BLOCKS} blocks. Split it.`);
    return null;
  }
  const blocks = items.flatMap((item, i) => readBlock(item, i, place, title, reading) ?? []);
  const wires = readWires(own(fields, 'wires') ?? [], title, reading);
  const annotations = readAnnotations(own(fields, 'annotations') ?? [], title, reading);
  return { blocks, wires, ...(annotations.length === 0 ? {} : { annotations }) };
}

function readWires(value: unknown, title: string, reading: Reading): readonly Wire[] {
  const items = readList(value, `${title}: "wires" is not a list.`, reading);
  return items.flatMap((item, i) => {
    const parsed = v.safeParse(wireSchema, item);
    if (parsed.success) return [withoutBlanks(parsed.output, ['name'])];
    note(reading, 'bad-value', `${title}, the wire at place ${i + 1}: ${whatIsWrong(parsed.issues[0])}`);
    return [];
  });
}

function isKind(kind: unknown): kind is BlockKind {
  return typeof kind === 'string' && Object.hasOwn(blockSchemas, kind);
}

function readBlock(item: unknown, i: number, place: SheetPlace, sheet: string, reading: Reading): Block | null {
  const fields: Fields = isFields(item) ? item : {};
  const [id, kind] = [own(fields, 'id'), own(fields, 'kind')];
  const hasId = v.is(blockSchemas.differentiator.entries.id, id);
  const concerns = hasId ? { blocks: [pathOf(place, id)] } : {};
  const called = hasId ? [...place.names, id].join('.') : null;
  if (!isKind(kind)) {
    const title = called === null ? `${sheet}, the block at place ${i + 1}` : `Block ${called}`;
    const fault = kind === undefined ? 'it has no kind.' : `${quote(String(kind))} is no kind of block.`;
    note(reading, 'unknown-kind', `${title}: ${fault} Kinds are ${Object.keys(KIND_WORDS).join(', ')}.`, concerns);
    return null;
  }
  const word = KIND_WORDS[kind];
  const capital = word.charAt(0).toUpperCase() + word.slice(1);
  const title = called === null ? `${sheet}, the ${word} at place ${i + 1}` : `${capital} ${called}`;
  const parsed = v.safeParse(blockSchemas[kind], item);
  if (!parsed.success) {
    note(reading, 'bad-value', `${title}: ${whatIsWrong(parsed.issues[0])}`, concerns);
    return null;
  }
  const block = withoutBlanks(parsed.output, ['name', 'unit', 'note']);
  if (block.kind === 'group') return readGroup(block, own(fields, 'sheet'), place, title, reading);
  const fault = block.kind === 'state-model' ? matrixShapeFault(block) : null;
  if (fault === null) return block;
  note(reading, 'bad-value', `${title}: ${fault}`, concerns);
  return null;
}

function readGroup(
  group: Omit<Extract<Block, { kind: 'group' }>, 'sheet'>,
  sheet: unknown,
  place: SheetPlace,
  title: string,
  reading: Reading,
): Block | null {
  const concerns = { blocks: [pathOf(place, group.id)] };
  if (place.ids.length >= DEEPEST_GROUP) {
    const message = `${title}: it stands inside ${DEEPEST_GROUP} other groups, which is as deep as they go. Open up one of them.`;
    note(reading, 'too-large', message, concerns);
    return null;
  }
  if (!isFields(sheet)) {
    note(reading, 'bad-value', `${title}: "sheet" is not { "blocks": [...], "wires": [...] }.`, concerns);
    return null;
  }
  const inside = { ids: [...place.ids, group.id], names: [...place.names, group.name ?? group.id] };
  const read = readSheet(sheet, inside, reading);
  return read === null ? null : { ...group, sheet: read };
}

/** Without the optional fields that say nothing: empty text, `mirrored: false`, no bend points. */
function withoutBlanks<T extends object>(fields: T, texts: readonly string[]): T {
  const isBlank = ([key, value]: [string, unknown]) =>
    (value === '' && texts.includes(key)) || (key === 'mirrored' && value === false) || isEmptyVia(key, value);
  const entries = Object.entries(fields);
  if (!entries.some(isBlank)) return fields;
  // Only optional fields are taken away, which leaves what T asks for.
  return Object.fromEntries(entries.filter(entry => !isBlank(entry))) as T;
}

const isEmptyVia = (key: string, value: unknown) => key === 'via' && Array.isArray(value) && value.length === 0;
