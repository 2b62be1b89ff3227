/**
 * Keeps each drawing as its own file text under its key, beside a list of titles, so that listing reads no drawing and a
 * damaged record costs one drawing, not all. Every failure of the store (full, refused, private window) is an answer.
 */

import { createStore, del, get, getMany, set, update } from 'idb-keyval';

/** A line of the list. `changed` is ISO 8601, UTC. */
export interface KeptDrawing {
  readonly key: string;
  readonly title: string;
  readonly changed: string;
  readonly blocks: number;
}

/** What the store said: the value, or one sentence for the screen. */
export type StorageAnswer<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly message: string };

const LIST_KEY = 'list';
const LAST_KEY = 'last';
const DRAWING_PREFIX = 'drawing:';

const store = () => createStore('poleward', 'drawings');

/** Writes the drawing's text and its line in the list; the newest first when listed. */
export function keepDrawing(line: KeptDrawing, text: string): Promise<StorageAnswer<void>> {
  return answering(async () => {
    const kept = store();
    await set(DRAWING_PREFIX + line.key, text, kept);
    await update<readonly KeptDrawing[]>(
      LIST_KEY,
      list => [line, ...(list ?? []).filter(({ key }) => key !== line.key)],
      kept,
    );
    await set(LAST_KEY, line.key, kept);
  });
}

/** All lines, the one changed last first. */
export function keptDrawings(): Promise<StorageAnswer<readonly KeptDrawing[]>> {
  return answering(async () => (await get<readonly KeptDrawing[]>(LIST_KEY, store())) ?? []);
}

/** The text kept under a key, null where there is none. */
export function readKept(key: string): Promise<StorageAnswer<string | null>> {
  return answering(async () => (await get<string>(DRAWING_PREFIX + key, store())) ?? null);
}

/** Key and text of the drawing that was open last, null where none was or it is gone. */
export function lastOpened(): Promise<StorageAnswer<{ readonly key: string; readonly text: string } | null>> {
  return answering(async () => {
    const kept = store();
    const [key] = await getMany<string | undefined>([LAST_KEY], kept);
    if (key === undefined) return null;
    const text = await get<string>(DRAWING_PREFIX + key, kept);
    return text === undefined ? null : { key, text };
  });
}

/** Remembers which drawing is open. */
export function setLastOpened(key: string): Promise<StorageAnswer<void>> {
  return answering(() => set(LAST_KEY, key, store()));
}

/** Takes a drawing and its line away. */
export function removeKept(key: string): Promise<StorageAnswer<void>> {
  return answering(async () => {
    const kept = store();
    await update<readonly KeptDrawing[]>(LIST_KEY, list => (list ?? []).filter(line => line.key !== key), kept);
    await del(DRAWING_PREFIX + key, kept);
  });
}

async function answering<T>(request: () => Promise<T>): Promise<StorageAnswer<T>> {
  try {
    return { ok: true, value: await request() };
  } catch (error) {
    const full = error instanceof DOMException && error.name === 'QuotaExceededError';
    const message = full
      ? 'The device has no room left for drawings. Save this one to a file and remove old ones.'
      : 'This browser does not let the page keep drawings. Save this one to a file.';
    return { ok: false, message };
  }
}
