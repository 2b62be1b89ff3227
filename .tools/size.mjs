/**
 * Weighs the first load of the built page: what has to arrive before the sheet can be drawn on and the derivation run,
 * compressed as servers send it (gzip). The page, its scripts and styles, the worker and what they import; not what is
 * imported on demand (results column, dialogs, analyses), nor fonts, without which the text is readable. Fails above the limit.
 */

import { readFileSync } from 'node:fs';
import { dirname, join, posix } from 'node:path';
import { gzipSync } from 'node:zlib';
import { isEntryPoint, root } from './project.mjs';

const LIMIT_KB = 220;
const dist = join(root, 'dist');

/** Names in `text` that `pattern` captures, resolved against the folder of the file they stand in. */
function referred(text, pattern, from) {
  return [...text.matchAll(pattern)].map(([, name]) => posix.join(dirname(from), name));
}

/** What one file makes the browser fetch at once: static imports, style sheets, workers; not what is imported on demand. */
function fetchedBy(name, text) {
  if (name.endsWith('.html')) {
    return referred(text, /<(?:script|link)\b[^>]*?\b(?:src|href)="([^":]+\.(?:js|css))"/g, name);
  }
  if (!name.endsWith('.js')) return [];
  return [
    ...referred(text, /(?:\bfrom|\bimport)\s*["'`](\.[^"'`]+\.js)["'`]/g, name),
    ...referred(text, /new URL\(["'`]([^"'`:]+\.js)["'`],\s*(?:""\s*\+\s*)?import\.meta\.url/g, name),
  ];
}

/** Every file of the first load, in the order in which it is met, with its sizes in bytes. */
export function firstLoad() {
  const files = new Map();
  const visit = name => {
    if (files.has(name)) return;
    const bytes = readFileSync(join(dist, name));
    files.set(name, { name, raw: bytes.length, gzip: gzipSync(bytes, { level: 9 }).length });
    for (const next of fetchedBy(name, bytes.toString('utf8'))) visit(next);
  };
  visit('index.html');
  return [...files.values()];
}

/** Prints the table; throws above the limit. */
export function weighFirstLoad() {
  const files = firstLoad();
  const total = files.reduce((sum, { gzip }) => sum + gzip, 0);
  const kB = bytes => (bytes / 1000).toFixed(1).padStart(8);
  for (const { name, raw, gzip } of files) process.stdout.write(`${kB(gzip)} kB gzip ${kB(raw)} kB  ${name}\n`);
  process.stdout.write(`${kB(total)} kB gzip in all, of ${LIMIT_KB} kB allowed\n`);
  const has = extension => files.some(({ name }) => name.endsWith(extension));
  if (!has('.js')) throw new Error('the first load holds no script: the build or this measure is wrong');
  if (total > LIMIT_KB * 1000) {
    throw new Error(
      `the first load is ${(total / 1000).toFixed(1)} kB gzip, above ${LIMIT_KB} kB; load something on demand`,
    );
  }
}

if (isEntryPoint(import.meta.url)) {
  try {
    weighFirstLoad();
  } catch (error) {
    process.stderr.write(`${error.message}\n`);
    process.exitCode = 1;
  }
}
