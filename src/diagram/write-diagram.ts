/** Documents to text: the fields in one order, so that the same document gives the same bytes and a change one line. */

import type { Requirement } from './requirements/index.ts';
import type { Annotation, Block, Cut, Diagram, Parameter, Sheet, Wire } from './types.ts';

/** Keys of a block in the order they are written; a group's sheet comes last. */
const BLOCK_KEYS = [
  'id',
  'kind',
  'name',
  'gain',
  'signs',
  'numerator',
  'denominator',
  'A',
  'B',
  'C',
  'D',
  'time',
  'order',
  'lower',
  'upper',
  'initial',
  'unit',
  'at',
  'mirrored',
  'note',
] as const;
const WIRE_KEYS = ['from', 'to', 'name', 'via'] as const;
const ANNOTATION_KEYS = ['id', 'kind', 'at', 'size', 'text'] as const;
const CUT_KEYS = ['to', 'name'] as const;
const REQUIREMENT_KEYS = ['kind', 'input', 'output', 'cut', 'band', 'most', 'least', 'tolerances', 'note'] as const;
const PARAMETER_KEYS = ['name', 'value', 'unit', 'tolerance', 'note', 'range'] as const;
const HEAD_KEYS = ['format', 'version', 'title', 'revision', 'date', 'author', 'notes'] as const;

/** The diagram file: one block, wire and parameter a line, a line feed at the end. Reading it gives the document back. */
export function writeDiagram(diagram: Diagram): string {
  const head = HEAD_KEYS.flatMap(key => (diagram[key] === undefined ? [] : [`  ${member(key, diagram[key])}`]));
  const lists = [list('parameters', diagram.parameters.map(oneLine(PARAMETER_KEYS)), 1), ...sheetLists(diagram, 1)];
  const cuts = diagram.cuts === undefined ? [] : [list('cuts', diagram.cuts.map(oneLine(CUT_KEYS)), 1)];
  const requirements =
    diagram.requirements === undefined
      ? []
      : [list('requirements', diagram.requirements.map(oneLine(REQUIREMENT_KEYS)), 1)];
  return `{\n${[...head, ...lists, ...cuts, ...requirements].join(',\n')}\n}\n`;
}

/** The same document without a space, for links. */
export function minifyDiagram(diagram: Diagram): string {
  return JSON.stringify({
    ...inOrder(diagram, HEAD_KEYS),
    parameters: diagram.parameters.map(parameter => inOrder(parameter, PARAMETER_KEYS)),
    ...minifySheet(diagram),
    ...(diagram.cuts === undefined ? {} : { cuts: diagram.cuts.map(cut => inOrder(cut, CUT_KEYS)) }),
    ...(diagram.requirements === undefined
      ? {}
      : { requirements: diagram.requirements.map(requirement => inOrder(requirement, REQUIREMENT_KEYS)) }),
  });
}

interface MinifiedSheet {
  readonly blocks: readonly object[];
  readonly wires: readonly object[];
  readonly annotations?: readonly object[];
}

function minifySheet(sheet: Sheet): MinifiedSheet {
  return {
    blocks: sheet.blocks.map(block => {
      const fields = inOrder(block, BLOCK_KEYS);
      return block.kind === 'group' ? { ...fields, sheet: minifySheet(block.sheet) } : fields;
    }),
    wires: sheet.wires.map(wire => inOrder(wire, WIRE_KEYS)),
    ...(sheet.annotations === undefined
      ? {}
      : { annotations: sheet.annotations.map(annotation => inOrder(withoutBlank(annotation), ANNOTATION_KEYS)) }),
  };
}

/** The fields that are there, in the order of `keys`. */
function inOrder(fields: object, keys: readonly string[]): Record<string, unknown> {
  const all: Readonly<Record<string, unknown>> = { ...fields };
  const ordered: Record<string, unknown> = {};
  for (const key of keys) if (all[key] !== undefined) ordered[key] = all[key];
  return ordered;
}

const member = (key: string, value: unknown) => `${JSON.stringify(key)}: ${spaced(value)}`;

/** JSON on one line with a space after each colon and comma. */
function spaced(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(spaced).join(', ')}]`;
  return JSON.stringify(value);
}

type Fields = Parameter | Wire | Block | Cut | Requirement | Partial<Annotation>;

function oneLine(keys: readonly string[]): (fields: Fields) => string {
  return fields => {
    const members = Object.entries(inOrder(fields, keys)).map(([key, value]) => member(key, value));
    return `{ ${members.join(', ')} }`;
  };
}

function list(key: string, items: readonly string[], level: number): string {
  const indent = '  '.repeat(level);
  if (items.length === 0) return `${indent}"${key}": []`;
  return `${indent}"${key}": [\n${items.map(item => `${indent}  ${item}`).join(',\n')}\n${indent}]`;
}

/** Recursion is as deep as groups are: at most 32. */
function sheetLists(sheet: Sheet, level: number): readonly string[] {
  const blocks = sheet.blocks.map(block => {
    const line = oneLine(BLOCK_KEYS)(block);
    if (block.kind !== 'group') return line;
    const inside = sheetLists(block.sheet, level + 2).join(',\n');
    const indent = '  '.repeat(level + 1);
    return `${line.slice(0, -2)}, "sheet": {\n${inside}\n${indent}} }`;
  });
  const lists = [list('blocks', blocks, level), list('wires', sheet.wires.map(oneLine(WIRE_KEYS)), level)];
  if (sheet.annotations === undefined) return lists;
  return [...lists, list('annotations', sheet.annotations.map(withoutBlank).map(oneLine(ANNOTATION_KEYS)), level)];
}

/** The annotation without a text that says nothing. */
function withoutBlank({ text, ...place }: Annotation): Partial<Annotation> {
  return text === '' ? place : { ...place, text };
}
