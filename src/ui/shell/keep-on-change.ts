/**
 * Keeps the drawing on the device while it changes: at most half a second after a change, and at once when the page is
 * hidden, so that a tab killed in mid-edit loses less than the last second.
 */

import { writeDiagram } from '../../diagram/index.ts';
import { keepDrawing } from '../../storage/index.ts';
import { actions, type State, store } from '../store/index.ts';

const DELAY_MILLISECONDS = 400;

export function keepOnChange(): void {
  let timer: ReturnType<typeof setTimeout> | null = null;
  let waiting: State['document'] | null = null;
  let writing: Promise<void> = Promise.resolve();

  const write = () => {
    if (timer !== null) clearTimeout(timer);
    timer = null;
    const document = waiting;
    waiting = null;
    if (document !== null) writing = writing.then(() => keep(document));
  };

  store.subscribe((now, before) => {
    if (now.document === before.document) return;
    if (waiting !== null && waiting.key !== now.document.key) write();
    waiting = now.document;
    timer ??= setTimeout(write, DELAY_MILLISECONDS);
  });
  window.addEventListener('pagehide', write);
  window.document.addEventListener('visibilitychange', () => {
    if (window.document.visibilityState === 'hidden') write();
  });
  waiting = store.getState().document;
  write();
}

async function keep({ key, diagram }: State['document']): Promise<void> {
  const now = new Date();
  const line = { key, title: diagram.title, changed: now.toISOString(), blocks: diagram.blocks.length };
  const answer = await keepDrawing(line, writeDiagram(diagram));
  if (store.getState().document.key !== key) return;
  const clock = now.toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });
  actions.setKept(answer.ok ? { at: clock } : { refused: answer.message });
}
