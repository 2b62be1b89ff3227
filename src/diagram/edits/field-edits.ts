/** Edits of a block's own fields, held to the same schema as a file. */

import * as v from 'valibot';
import { fail, ok, problem, type Result } from '../../problem/index.ts';
import { blockSchemas, matrixShapeFault, whatIsWrong } from '../reading/index.ts';
import { blockTitleAtStart } from '../titles.ts';
import type { Block, BlockKind, Sheet } from '../types.ts';
import { blockOf } from './block-edits.ts';
import type { SetField, SetMatrices } from './edit.ts';
import { replaceBlock } from './sheets.ts';

/** The fields of each kind that are one text; `true` where the block can do without. */
const FIELDS: Readonly<Record<BlockKind, Readonly<Record<string, 'required' | 'optional'>>>> = {
  input: { unit: 'optional', note: 'optional' },
  output: { unit: 'optional', note: 'optional' },
  gain: { gain: 'required', note: 'optional' },
  summer: { signs: 'required', note: 'optional' },
  integrator: { initial: 'optional', unit: 'optional', note: 'optional' },
  'transfer-function': { numerator: 'required', denominator: 'required', note: 'optional' },
  'state-model': { note: 'optional' },
  delay: { time: 'required', order: 'optional', note: 'optional' },
  differentiator: { note: 'optional' },
  limiter: { lower: 'required', upper: 'required', note: 'optional' },
  group: { note: 'optional' },
};

/** Sets one field; what a summing point has lost with its signs is wired no longer. */
export function setField(sheet: Sheet, { id, field, value }: SetField): Result<Sheet> {
  const found = blockOf(sheet, id);
  if (!found.ok) return found;
  const block = found.value;
  const need = Object.hasOwn(FIELDS[block.kind], field) ? FIELDS[block.kind][field] : undefined;
  if (need === undefined) {
    return fail(problem('bad-value', `${blockTitleAtStart(block)} has no field "${field}".`, { blocks: [id] }));
  }
  const text = value.trim();
  const present = Object.entries(block).find(([key]) => key === field)?.[1];
  if (need === 'optional' && text === '') return ok(present === undefined ? sheet : withoutField(sheet, block, field));
  const changed = field === 'order' ? orderOf(text) : text;
  return changed === present ? ok(sheet) : withFields(sheet, block, { [field]: changed });
}

/** The number that the text says; what is no number is left to the schema. */
const orderOf = (text: string): number | string => (/^\d+$/.test(text) ? Number(text) : text);

function withoutField(sheet: Sheet, block: Block, field: string): Sheet {
  const kept = Object.fromEntries(Object.entries(block).filter(([key]) => key !== field));
  return replaceBlock(sheet, block, kept as unknown as Block); // only an optional field is gone
}

/** The block with some fields replaced, where its schema takes them. */
function withFields(sheet: Sheet, block: Block, fields: object): Result<Sheet> {
  const changed = { ...block, ...fields };
  const parsed = v.safeParse(blockSchemas[block.kind], changed);
  if (!parsed.success) {
    const message = `${blockTitleAtStart(block)}: ${whatIsWrong(parsed.issues[0])}`;
    return fail(problem('bad-value', message, { blocks: [block.id] }));
  }
  return ok(replaceBlock(sheet, block, changed));
}

/** Sets the matrices of a state model; wires at inputs and outputs that it has lost are gone. */
export function setMatrices(sheet: Sheet, { id, A, B, C, D, initial }: SetMatrices): Result<Sheet> {
  const found = blockOf(sheet, id);
  if (!found.ok) return found;
  const block = found.value;
  if (block.kind !== 'state-model') {
    return fail(problem('bad-value', `${blockTitleAtStart(block)} has no matrices.`, { blocks: [id] }));
  }
  const { initial: former, ...kept } = block;
  const isSame = JSON.stringify([A, B, C, D, initial]) === JSON.stringify([block.A, block.B, block.C, block.D, former]);
  if (isSame) return ok(sheet);
  const changed = { ...kept, A, B, C, D, ...(initial === undefined ? {} : { initial }) };
  const fault = matrixShapeFault(changed);
  if (fault === null) return ok(replaceBlock(sheet, block, changed));
  return fail(problem('bad-value', `${blockTitleAtStart(block)}: ${fault}`, { blocks: [id] }));
}
