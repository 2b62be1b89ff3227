/** One format of the table, made by the worker, then copied or saved; what went wrong is said, never swallowed. */

import type { Format } from '../../deliver/index.ts';
import type { Notation } from '../../worker/index.ts';
import { derivationLine } from '../answers/index.ts';
import { copyText } from '../shell/copy-text.ts';
import { actions, store } from '../store/index.ts';
import { fileName, saveFile } from './save-file.ts';

/** What saving has to know of a format. */
export type SavedFormat = Pick<Format, 'id' | 'label' | 'extension' | 'mime'>;

export async function saveFormat(format: SavedFormat, notation: Notation, minimal = false): Promise<void> {
  const content = await contentOf(format, notation, minimal);
  if (content === null) return;
  const name = fileName(store.getState().document.diagram.title, format.extension);
  saveFile(name, new Blob([content], { type: format.mime }));
  actions.notify(`Saved ${name}.`);
}

export async function copyFormat(format: Format, notation: Notation, minimal = false): Promise<void> {
  const content = await contentOf(format, notation, minimal);
  if (typeof content !== 'string') return;
  const isCopied = await copyText(content);
  if (isCopied) actions.notify(`Copied as ${format.label}.`);
  else actions.notify('This browser does not let the page copy. Save the file instead.', 'refused');
}

async function contentOf(
  format: Pick<Format, 'id'>,
  notation: Notation,
  minimal: boolean,
): Promise<string | Uint8Array<ArrayBuffer> | null> {
  const { outcome } = await derivationLine.file(store.getState().document.diagram, format.id, notation, minimal);
  if (outcome.ok) return outcome.value;
  actions.notify(outcome.problems[0]?.message ?? 'The file could not be made.', 'refused');
  return null;
}
