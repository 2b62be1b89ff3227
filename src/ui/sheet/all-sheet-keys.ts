/** Every key on the sheet, in the order in which what is chosen is asked: annotations, then wires and commands, then blocks. */

import { ANNOTATION_KEYS } from '../annotations/annotation-keys.ts';
import type { KeyRow } from '../keys/index.ts';
import { COMMAND_KEYS } from './command-keys.ts';
import { BLOCK_KEYS, VIEW_KEYS } from './sheet-keys.ts';

export const SHEET_KEYS: readonly KeyRow[] = [...ANNOTATION_KEYS, ...COMMAND_KEYS, ...BLOCK_KEYS, ...VIEW_KEYS];
