/** What Enter will do with the line as it stands, said while it is typed; and how its last name can go on. */

import { displayName, type Sheet } from '../../diagram/index.ts';
import { readWiring, readWrittenBlock, wiredBlock } from '../../diagram/write-a-block/index.ts';
import { shownTitle } from '../sheet/block-sentence.ts';
import { readQuoted } from './read-quoted.ts';

interface Surroundings {
  readonly sheet: Sheet;
  readonly parameters: readonly { readonly name: string; readonly value: string }[];
  /** Title of the block that the next one is wired from; null where there is none. */
  readonly from: string | null;
}

/** `Enter places gain K_p = 0.5, wired from integrator q`; empty while nothing can be said. */
export function sayBefore(text: string, { sheet, parameters, from }: Surroundings): string {
  if (text.trim() === '') return '';
  if (readQuoted(text) !== null) return 'Enter places this text on the sheet';
  const wiring = readWiring(text);
  if (wiring !== null) {
    const block = wiredBlock(sheet, wiring);
    if (block === null) return `There is no block ${wiring.to} yet`;
    if (from === null) return 'Select the block that the wire starts at first';
    const sign =
      block.kind === 'summer' && wiring.sign !== null ? ` with ${wiring.sign === '-' ? 'minus' : 'plus'}` : '';
    return `Enter wires ${from} to ${shownTitle(block)}${sign}`;
  }
  const read = readWrittenBlock(text);
  if (!read.ok) return '';
  const { block, names, defines } = read.value;
  const values = new Map(parameters.map(({ name, value }) => [name, value]));
  const title = shownTitle({ ...block, id: '' });
  const value = defines?.value ?? (block.kind === 'gain' ? values.get(block.gain) : undefined);
  const said = [`Enter places ${title}${value === undefined ? '' : ` = ${value}`}`];
  if (from !== null && block.kind !== 'input') said.push(`wired from ${from}`);
  const fresh = names.filter(name => !values.has(name) && name !== defines?.name);
  if (fresh.length === 0) return said.join(', ');
  return `${said.join(', ')}. ${fresh.join(', ')} ${fresh.length === 1 ? 'is new: Enter adds it' : 'are new: Enter adds them'} with value 1`;
}

/** Most names that are offered at a time. */
const MOST = 6;

/** Names that the end of the text can go on to: blocks after `@`, else parameters; none where it is one already. */
export function completions(text: string, { sheet, parameters }: Surroundings): readonly string[] {
  const stem = readQuoted(text) === null ? stemOf(text) : null;
  if (stem === null) return [];
  const names = text.trimStart().startsWith('@') ? sheet.blocks.map(displayName) : parameters.map(({ name }) => name);
  const small = stem.toLowerCase();
  const fitting = [...new Set(names)].filter(name => name.toLowerCase().startsWith(small));
  return fitting.includes(stem) ? [] : fitting.slice(0, MOST);
}

/** The text with the name at its end written out. */
export function completed(text: string, name: string): string {
  const stem = stemOf(text);
  return stem === null ? text : text.slice(0, text.length - stem.length) + name;
}

/** The beginning of a name at the end of the text; null where there is none, or where a new signal is being named. */
function stemOf(text: string): string | null {
  if (/^\s*(?:>|1\s*\/\s*s\s)/.test(text)) return null;
  return /(?<![A-Za-z0-9_.])[A-Za-z][A-Za-z0-9_]*$/.exec(text)?.[0] ?? null;
}
