/** Edits of parameters and of the title block. */

import { onOneLine, parameterNameFault, renameIn } from '../../expression/index.ts';
import { fail, ok, type Problem, problem, type Result } from '../../problem/index.ts';
import { MOST_PARAMETERS } from '../limits.ts';
import { keepSame, mapQuantities } from '../quantities.ts';
import type { Block, Diagram, Parameter } from '../types.ts';
import type {
  AddParameter,
  RemoveParameter,
  RenameParameter,
  ReorderParameters,
  SetParameter,
  SetTitleFields,
} from './edit.ts';
import { renamedInBounds, withRequirements } from './requirement-edits.ts';

function nameFault({ parameters }: Diagram, name: string): Problem | null {
  const fault = parameterNameFault(name);
  if (fault !== null) return problem('bad-value', `Parameter ${onOneLine(name)}: ${fault}`, { parameter: name });
  if (!parameters.some(parameter => parameter.name === name)) return null;
  const message = `Parameter ${onOneLine(name)}: there is one of this name already. Choose another name.`;
  return problem('duplicate-name', message, { parameter: name });
}

function goneParameter(name: string): Problem {
  return problem('unknown-parameter', `There is no parameter ${onOneLine(name)}. Choose one that is there.`, {
    parameter: name,
  });
}

/** Adds a parameter whose name is legal and new. */
export function addParameter(diagram: Diagram, { parameter, index }: AddParameter): Result<Diagram> {
  const { parameters } = diagram;
  const fault = nameFault(diagram, parameter.name);
  if (fault !== null) return fail(fault);
  if (parameters.length >= MOST_PARAMETERS) {
    return fail(problem('too-large', `A drawing has at most ${MOST_PARAMETERS} parameters. Remove one first.`));
  }
  const place = Math.max(0, Math.min(index ?? parameters.length, parameters.length));
  return ok({
    ...diagram,
    parameters: [...parameters.slice(0, place), withoutBlanks(parameter), ...parameters.slice(place)],
  });
}

const OPTIONAL = ['unit', 'tolerance', 'note'] as const;

/** Without optional texts that are blank. */
function withoutBlanks(parameter: Parameter): Parameter {
  const { name, value, range } = parameter;
  const kept: { -readonly [K in (typeof OPTIONAL)[number]]?: string } = {};
  for (const key of OPTIONAL) {
    const text = parameter[key]?.trim() ?? '';
    if (text !== '') kept[key] = text;
  }
  return { name, value: value.trim(), ...kept, ...(range === undefined ? {} : { range }) };
}

/** Removes a parameter from the table. */
export function removeParameter(diagram: Diagram, { name }: RemoveParameter): Result<Diagram> {
  const parameters = diagram.parameters.filter(parameter => parameter.name !== name);
  if (parameters.length === diagram.parameters.length) return fail(goneParameter(name));
  return ok({ ...diagram, parameters });
}

/** Renames a parameter wherever it is used. */
export function renameParameter(diagram: Diagram, { from, to }: RenameParameter): Result<Diagram> {
  if (!diagram.parameters.some(({ name }) => name === from)) return fail(goneParameter(from));
  if (from === to) return ok(diagram);
  const fault = nameFault(diagram, to);
  if (fault !== null) return fail(fault);
  const rename = (text: string) => renameIn(text, from, to);
  const changed = {
    ...diagram,
    parameters: keepSame(diagram.parameters, parameter => renamed(parameter, from, to)),
    blocks: keepSame(diagram.blocks, block => renamedBlock(block, rename)),
  };
  const { requirements } = diagram;
  return ok(requirements === undefined ? changed : withRequirements(changed, renamedInBounds(requirements, rename)));
}

function renamed(parameter: Parameter, from: string, to: string): Parameter {
  const name = parameter.name === from ? to : parameter.name;
  const value = renameIn(parameter.value, from, to);
  const tolerance = parameter.tolerance === undefined ? undefined : renameIn(parameter.tolerance, from, to);
  if (name === parameter.name && value === parameter.value && tolerance === parameter.tolerance) return parameter;
  return { ...parameter, name, value, ...(tolerance === undefined ? {} : { tolerance }) };
}

/** Recursion is as deep as groups are: at most 32. */
function renamedBlock(block: Block, rename: (text: string) => string): Block {
  if (block.kind !== 'group') return mapQuantities(block, rename);
  const blocks = keepSame(block.sheet.blocks, inner => renamedBlock(inner, rename));
  return blocks === block.sheet.blocks ? block : { ...block, sheet: { ...block.sheet, blocks } };
}

/** Sets what is given of a parameter. */
export function setParameter(diagram: Diagram, edit: SetParameter): Result<Diagram> {
  const former = diagram.parameters.find(({ name }) => name === edit.name);
  if (former === undefined) return fail(goneParameter(edit.name));
  const { kind: _, range = former.range, ...given } = edit;
  const { range: __, ...texts } = former;
  const changed = withoutBlanks({ ...texts, ...given, ...(range ? { range } : {}) });
  const isSame =
    former.value === changed.value &&
    OPTIONAL.every(key => former[key] === changed[key]) &&
    former.range?.[0] === changed.range?.[0] &&
    former.range?.[1] === changed.range?.[1];
  if (isSame) return ok(diagram);
  const parameters = diagram.parameters.map(parameter => (parameter === former ? changed : parameter));
  return ok({ ...diagram, parameters });
}

/** Brings the parameters into another order. */
export function reorderParameters(diagram: Diagram, { names }: ReorderParameters): Result<Diagram> {
  const known = new Map(diagram.parameters.map(parameter => [parameter.name, parameter]));
  const gone = names.find(name => !known.has(name));
  if (gone !== undefined) return fail(goneParameter(gone));
  const ordered = [...new Set([...names, ...known.keys()])].flatMap(name => known.get(name) ?? []);
  const isSame = ordered.every((parameter, i) => parameter === diagram.parameters[i]);
  return ok(isSame ? diagram : { ...diagram, parameters: ordered });
}

const TITLE_FIELDS = ['notes', 'revision', 'date', 'author'] as const;

/** Sets what is given of the title block. */
export function setTitleFields(diagram: Diagram, edit: SetTitleFields): Result<Diagram> {
  let changed: Diagram = diagram;
  if (edit.title !== undefined && edit.title !== diagram.title) changed = { ...changed, title: edit.title };
  for (const key of TITLE_FIELDS) {
    const text = edit[key];
    if (text === undefined || text === (changed[key] ?? '')) continue;
    const { [key]: _, ...kept } = changed;
    changed = text === '' ? kept : { ...kept, [key]: text };
  }
  return ok(changed);
}
