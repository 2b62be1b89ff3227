/**
 * What every tool needs to know of the project: where it is and whether a build is up to date. Bare Node, nothing
 * installed, and few of Node's own modules: the command line goes through here each time it starts.
 */

import { mkdirSync, readdirSync, readFileSync, realpathSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's folder. */
export const root = dirname(dirname(fileURLToPath(import.meta.url)));

/** Whether the module is the one that Node was started with. */
export function isEntryPoint(moduleAddress) {
  const started = process.argv[1];
  return started !== undefined && realpathSync(started) === fileURLToPath(moduleAddress);
}

/** What a build is made from. */
const sources = ['src', 'public', 'index.html', 'vite.config.ts', 'package.json', 'package-lock.json', 'tsconfig.json'];

/** Changes whenever a source is edited, added, taken away or renamed: from names, sizes and times, without reading a file. */
export function sourcesFingerprint() {
  const lines = [];
  const visit = path => {
    const stat = statSync(join(root, path), { throwIfNoEntry: false });
    if (stat === undefined) return;
    if (stat.isDirectory()) {
      for (const name of readdirSync(join(root, path)).sort()) visit(`${path}/${name}`);
    } else {
      lines.push(`${path}\t${stat.size}\t${stat.mtimeMs}\n`);
    }
  };
  sources.forEach(visit);
  return lines.join('');
}

/** Where in dist the fingerprint stands that a build was made from. */
export const PAGE_STAMP = '.page-built-from';
export const COMMAND_LINE_STAMP = 'cli/.built-from';

/** Whether `dist` holds a build of the sources as they are. */
export function isBuilt(stamp, fingerprint) {
  try {
    return readFileSync(join(root, 'dist', stamp), 'utf8') === fingerprint;
  } catch (error) {
    if (error.code === 'ENOENT') return false;
    throw error;
  }
}

/** Records which sources a build in `dist` was made from; taken before the build began, so that an edit meanwhile counts. */
export function markBuilt(stamp, fingerprint) {
  const path = join(root, 'dist', stamp);
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, fingerprint);
}
