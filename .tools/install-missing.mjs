/**
 * Makes node_modules what package-lock.json says, with the fewest steps: nothing where it already is, `npm ci` otherwise.
 * Runs on bare Node with nothing installed. `node .tools/install-missing.mjs`, or `installMissing()` from another tool.
 */

import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { isEntryPoint, root } from './project.mjs';

const lockFile = join(root, 'package-lock.json');
/** Hash of the lock file that node_modules was last found to match. */
const stampFile = join(root, 'node_modules', '.installed-from');

/** Installs what is missing and says on standard error that it does; throws where that fails. */
export function installMissing() {
  const lock = readFileSync(lockFile);
  const hash = createHash('sha256').update(lock).digest('hex');
  if (textOf(stampFile) === hash) return;
  if (!isInstalled(JSON.parse(lock.toString('utf8')))) {
    process.stderr.write('Installing the packages of package-lock.json …\n');
    const { status } = spawnSync('npm', ['ci', '--no-fund', '--no-audit'], {
      cwd: root,
      stdio: ['ignore', 2, 2],
      shell: process.platform === 'win32',
    });
    if (status !== 0) throw new Error('npm ci did not succeed; its own message stands above');
  }
  writeFileSync(stampFile, hash);
}

/** Whether npm's own record of node_modules holds each package at the version of the lock file. */
function isInstalled(lock) {
  const record = textOf(join(root, 'node_modules', '.package-lock.json'));
  if (record === null) return false;
  const installed = JSON.parse(record).packages ?? {};
  return Object.entries(lock.packages).every(([path, { version, optional }]) => {
    if (path === '') return true;
    const found = installed[path];
    // An optional package is one for another machine or one that could not be had: npm leaves it out.
    return found === undefined ? optional === true : found.version === version;
  });
}

function textOf(path) {
  try {
    return readFileSync(path, 'utf8');
  } catch (error) {
    if (error.code === 'ENOENT') return null;
    throw error;
  }
}

if (isEntryPoint(import.meta.url)) installMissing();
