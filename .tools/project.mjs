/**
 * What every tool needs to know of the project: where it is, how its own programs are run, whether a build is up to date.
 * Bare Node, nothing installed.
 */

import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, realpathSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { stripVTControlCharacters } from 'node:util';

/** The project's folder. */
export const root = dirname(dirname(fileURLToPath(import.meta.url)));

/** Whether the module is the one that Node was started with. */
export function isEntryPoint(moduleAddress) {
  const started = process.argv[1];
  return started !== undefined && realpathSync(started) === fileURLToPath(moduleAddress);
}

/** Scripts that the packages' commands stand for: run through Node itself, no shell and no .cmd between. */
const scripts = {
  vite: 'node_modules/vite/bin/vite.js',
  vitest: 'node_modules/vitest/vitest.mjs',
  playwright: 'node_modules/playwright/cli.js',
};

/**
 * Runs one of the packages' commands and waits for it.
 *
 * @param show  true: what it prints goes to this terminal; false: it is kept and handed back as `printed`.
 * @returns     `status`, the exit status; null where it was ended by a signal.
 */
export function run(command, commandArguments, { show = true, environment = {} } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, [join(root, scripts[command]), ...commandArguments], {
      cwd: root,
      env: { ...process.env, ...environment },
      stdio: show ? ['ignore', 'inherit', 'inherit'] : ['ignore', 'pipe', 'pipe'],
    });
    let printed = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream?.setEncoding('utf8').on('data', text => {
        printed += text;
      });
    }
    child.on('error', reject);
    child.on('close', status => resolve({ status, printed: stripVTControlCharacters(printed) }));
  });
}

/** What a build is made from. */
const sources = ['src', 'public', 'index.html', 'vite.config.ts', 'package.json', 'package-lock.json', 'tsconfig.json'];

/** Changes whenever a source is edited, added, taken away or renamed: from names, sizes and times, without reading a file. */
export function sourcesFingerprint() {
  const hash = createHash('sha256');
  const visit = path => {
    const stat = statSync(join(root, path), { throwIfNoEntry: false });
    if (stat === undefined) return;
    if (stat.isDirectory()) {
      for (const name of readdirSync(join(root, path)).sort()) visit(`${path}/${name}`);
    } else {
      hash.update(`${path}\t${stat.size}\t${stat.mtimeMs}\n`);
    }
  };
  sources.forEach(visit);
  return hash.digest('hex');
}

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
