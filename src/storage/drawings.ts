/**
 * Keeps each drawing as its own file text under its key, beside a list of titles, so that listing reads no drawing and a
 * damaged record costs one drawing, not all. Every failure of the store (full, refused, private window) is an answer.
 */

import { createStore, delMany, get, getMany, set, update } from 'idb-keyval';
import { type KeptVersion, thinned } from './thinned.ts';

/** A line of the list. `changed` is ISO 8601, UTC. */
export interface KeptDrawing {
  readonly key: string;
  readonly title: string;
  readonly changed: string;
  readonly blocks: number;
}

/** A line of the bin. `removed` is ISO 8601, UTC. */
export interface BinnedDrawing extends KeptDrawing {
  readonly removed: string;
}

/** What the store said: the value, or one sentence for the screen. */
export type StorageAnswer<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly message: string };

const LIST_KEY = 'list';
const LAST_KEY = 'last';
const BIN_KEY = 'bin';
const DRAWING_PREFIX = 'drawing:';
const VERSIONS_PREFIX = 'versions:';
const MOST_VERSIONS = 50;
const BIN_MILLISECONDS = 30 * 24 * 3600 * 1000;

const store = () => createStore('poleward', 'drawings');

/**
 * Writes the drawing's text and its line in the list; the newest first when listed. Writes nothing, and says so, where the record is
 * neither `expected` nor `text`: another tab has written it since. The comparison and the writing are one transaction.
 *
 * @param expected  what this tab read or wrote last; null where it knows of no record.
 */
export function keepDrawing(
  line: KeptDrawing,
  text: string,
  expected: string | null,
): Promise<StorageAnswer<'kept' | 'changed elsewhere'>> {
  return answering(async () => {
    const kept = store();
    let isOurs = true;
    await update<string>(
      DRAWING_PREFIX + line.key,
      there => {
        isOurs = there === undefined || there === expected || there === text;
        return isOurs || there === undefined ? text : there;
      },
      kept,
    );
    if (!isOurs) return 'changed elsewhere';
    await putLine(line, kept);
    await set(LAST_KEY, line.key, kept);
    return 'kept';
  });
}

function putLine(line: KeptDrawing, kept: ReturnType<typeof store>): Promise<void> {
  return update<readonly KeptDrawing[]>(
    LIST_KEY,
    list => [line, ...(list ?? []).filter(({ key }) => key !== line.key)],
    kept,
  );
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

/** Puts a drawing into the bin, and takes what has lain there for more than 30 days away for good. */
export function removeKept(line: KeptDrawing): Promise<StorageAnswer<void>> {
  return answering(async () => {
    const kept = store();
    const now = new Date().toISOString();
    await update<readonly BinnedDrawing[]>(
      BIN_KEY,
      bin => [{ ...line, removed: now }, ...(bin ?? []).filter(({ key }) => key !== line.key)],
      kept,
    );
    await update<readonly KeptDrawing[]>(LIST_KEY, list => (list ?? []).filter(({ key }) => key !== line.key), kept);
    await emptyOldBin(kept);
  });
}

/** What lies in the bin, the one removed last first. */
export function binnedDrawings(): Promise<StorageAnswer<readonly BinnedDrawing[]>> {
  return answering(async () => (await get<readonly BinnedDrawing[]>(BIN_KEY, store())) ?? []);
}

/** Puts a drawing of the bin back into the list. */
export function bringBack({ removed: _, ...line }: BinnedDrawing): Promise<StorageAnswer<void>> {
  return answering(async () => {
    const kept = store();
    await putLine(line, kept);
    await update<readonly BinnedDrawing[]>(BIN_KEY, bin => (bin ?? []).filter(({ key }) => key !== line.key), kept);
  });
}

/** Takes a drawing of the bin and its versions away for good, which makes room. */
export function removeForGood(key: string): Promise<StorageAnswer<void>> {
  return answering(async () => {
    const kept = store();
    await delMany([DRAWING_PREFIX + key, VERSIONS_PREFIX + key], kept);
    await update<readonly BinnedDrawing[]>(BIN_KEY, bin => (bin ?? []).filter(line => line.key !== key), kept);
  });
}

async function emptyOldBin(kept: ReturnType<typeof store>): Promise<void> {
  const bin = (await get<readonly BinnedDrawing[]>(BIN_KEY, kept)) ?? [];
  const listed = new Set(((await get<readonly KeptDrawing[]>(LIST_KEY, kept)) ?? []).map(({ key }) => key));
  const oldest = Date.now() - BIN_MILLISECONDS;
  const isOld = ({ removed }: BinnedDrawing) => Date.parse(removed) < oldest;
  for (const { key } of bin.filter(line => isOld(line) && !listed.has(line.key))) {
    await delMany([DRAWING_PREFIX + key, VERSIONS_PREFIX + key], kept);
  }
  await set(
    BIN_KEY,
    bin.filter(line => !isOld(line)),
    kept,
  );
}

/** Keeps a version of a drawing, unless the newest one reads the same. */
export function keepVersion(key: string, version: KeptVersion): Promise<StorageAnswer<void>> {
  return answering(() =>
    update<readonly KeptVersion[]>(
      VERSIONS_PREFIX + key,
      list => {
        const versions = list ?? [];
        return versions.at(-1)?.text === version.text ? versions : thinned([...versions, version], MOST_VERSIONS);
      },
      store(),
    ),
  );
}

/** The versions of a drawing, the oldest first. */
export function versionsOf(key: string): Promise<StorageAnswer<readonly KeptVersion[]>> {
  return answering(async () => (await get<readonly KeptVersion[]>(VERSIONS_PREFIX + key, store())) ?? []);
}

async function answering<T>(request: () => Promise<T>): Promise<StorageAnswer<T>> {
  try {
    return { ok: true, value: await request() };
  } catch (error) {
    const full = error instanceof DOMException && error.name === 'QuotaExceededError';
    const message = full
      ? 'The device has no room left for drawings. Save this one to a file and remove old ones for good.'
      : 'This browser does not let the page keep drawings. Save this one to a file.';
    return { ok: false, message };
  }
}
