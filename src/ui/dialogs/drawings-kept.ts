/** What the list of drawings does with a kept one: open, rename, duplicate. What goes wrong is said. */

import { type Diagram, writeDiagram } from '../../diagram/index.ts';
import { type KeptDrawing, keepDrawing, readKept, setLastOpened } from '../../storage/index.ts';
import { newKey } from '../shell/new-key.ts';
import { actions, store } from '../store/index.ts';
import { diagramOf } from './DrawingPicture.tsx';

/** The kept drawing; null, and said, where it cannot be read. */
async function kept(line: KeptDrawing): Promise<{ readonly diagram: Diagram; readonly text: string } | null> {
  const answer = await readKept(line.key);
  const text = answer.ok ? answer.value : null;
  const diagram = diagramOf(text);
  if (diagram !== null && text !== null) return { diagram, text };
  actions.notify(answer.ok ? `${line.title || 'untitled'} cannot be read.` : answer.message, 'refused');
  return null;
}

export async function openKept(line: KeptDrawing): Promise<void> {
  const found = await kept(line);
  if (found === null) return;
  actions.openDrawing(found.diagram, line.key, `Opened ${line.title || 'untitled'}.`);
  actions.openDialog(null);
}

export async function renameKept(line: KeptDrawing, title: string): Promise<void> {
  if (line.key === store.getState().document.key) {
    actions.edit({ kind: 'setTitleFields', title });
    return;
  }
  const found = await kept(line);
  if (found !== null)
    await put({ ...found.diagram, title }, line.key, found.text, `Renamed to ${title || 'untitled'}.`);
}

export async function duplicateKept(line: KeptDrawing): Promise<void> {
  const found = await kept(line);
  if (found === null) return;
  const title = `${line.title || 'untitled'}, copy`;
  await put({ ...found.diagram, title }, newKey(), null, `Kept ${title}.`);
}

async function put(diagram: Diagram, key: string, expected: string | null, said: string): Promise<void> {
  const line = { key, title: diagram.title, changed: new Date().toISOString(), blocks: diagram.blocks.length };
  const answer = await keepDrawing(line, writeDiagram(diagram), expected);
  await setLastOpened(store.getState().document.key);
  if (!answer.ok) actions.notify(answer.message, 'refused');
  else if (answer.value === 'kept') actions.notify(said);
  else actions.notify('Another tab has just changed that drawing. Open the list again.', 'refused');
}
