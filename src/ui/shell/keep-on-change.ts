/**
 * Keeps the drawing on the device while it changes: at most half a second after a change, and at once when the page is
 * hidden, so that a tab killed in mid-edit loses less than the last second.
 */

import { writeDiagram } from '../../diagram/index.ts';
import { keepDrawing, keepVersion, readKept } from '../../storage/index.ts';
import { actions, type State, store } from '../store/index.ts';
import { newKey } from './new-key.ts';

const DELAY_MILLISECONDS = 400;

export function keepOnChange(): void {
  let timer: ReturnType<typeof setTimeout> | null = null;
  let isAsked = false;
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
    if (now.document.key === before.document.key && !isAsked) {
      isAsked = true;
      void askToPersist();
    }
    if (waiting !== null && waiting.key !== now.document.key) write();
    waiting = now.document;
    timer ??= setTimeout(write, DELAY_MILLISECONDS);
  });
  window.addEventListener('pagehide', write);
  window.document.addEventListener('visibilitychange', () => {
    if (window.document.visibilityState === 'hidden') write();
  });
  keepVersionAtExport();
  waiting = store.getState().document;
  write();
}

/** What this tab read or wrote last under each key; null where there was nothing. */
const known = new Map<string, string | null>();

async function keep({ key, diagram }: Pick<State['document'], 'key' | 'diagram'>): Promise<void> {
  const text = writeDiagram(diagram);
  if (!known.has(key)) {
    const there = await readKept(key);
    if (there.ok) known.set(key, there.value);
    if (there.ok && there.value !== null) await keepVersionNow(key, diagram.blocks.length, text);
  }
  const now = new Date();
  const line = { key, title: diagram.title, changed: now.toISOString(), blocks: diagram.blocks.length };
  const answer = await keepDrawing(line, text, known.get(key) ?? null);
  if (answer.ok && answer.value === 'changed elsewhere') return keepAsCopy({ key, diagram });
  if (answer.ok) {
    known.set(key, text);
    if (Date.now() - (versioned.get(key) ?? 0) > VERSION_MILLISECONDS) {
      await keepVersionNow(key, diagram.blocks.length, text);
    }
  }
  if (store.getState().document.key !== key) return;
  const clock = now.toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });
  actions.setKept(answer.ok ? { at: clock } : { refused: answer.message });
}

const COPY_SAID = 'Another tab has changed this drawing. Yours goes on as a copy of its own; both are under Drawings.';

/** Another tab has written the record: what was on this sheet goes on, or is kept, under a key of its own. */
async function keepAsCopy({ key, diagram }: Pick<State['document'], 'key' | 'diagram'>): Promise<void> {
  if (store.getState().document.key === key) return actions.goOnAsCopy(newKey(), COPY_SAID);
  const title = `${diagram.title || 'untitled'} (from another tab)`;
  const line = { key: newKey(), title, changed: new Date().toISOString(), blocks: diagram.blocks.length };
  const answer = await keepDrawing(line, writeDiagram({ ...diagram, title }), null);
  actions.notify(
    answer.ok ? `Another tab had changed that drawing. Yours is kept as ${title}.` : answer.message,
    'refused',
  );
}

/** How much time of change lies between two versions. */
const VERSION_MILLISECONDS = 10 * 60 * 1000;
const versioned = new Map<string, number>();

async function keepVersionNow(key: string, blocks: number, text: string): Promise<void> {
  if (blocks === 0) return;
  versioned.set(key, Date.now());
  const answer = await keepVersion(key, { at: new Date().toISOString(), blocks, text });
  if (!answer.ok) actions.notify(`No version was kept. ${answer.message}`, 'refused');
}

/** Keeps a version of what is handed over. */
function keepVersionAtExport(): void {
  store.subscribe((now, before) => {
    if (now.view.dialog !== 'export' || before.view.dialog === 'export') return;
    const { key, diagram } = now.document;
    void keepVersionNow(key, diagram.blocks.length, writeDiagram(diagram));
  });
}

/** Asks once, with the first change, that the browser does not clear what is kept; a refusal changes nothing. */
async function askToPersist(): Promise<void> {
  try {
    await navigator.storage?.persist?.();
  } catch {
    // Some browsers throw where they refuse; drawings are kept all the same.
  }
}
