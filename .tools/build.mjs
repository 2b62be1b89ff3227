/**
 * Builds the page into dist and the command line into dist/cli, each only where its sources changed since.
 * A build lands once it is complete: one that fails, or two at a time, leave what was there before in working order.
 */

import { mkdirSync, readdirSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { installMissing } from './install-missing.mjs';
import {
  COMMAND_LINE_STAMP,
  isBuilt,
  isEntryPoint,
  markBuilt,
  PAGE_STAMP,
  root,
  sourcesFingerprint,
} from './project.mjs';
import { run } from './run.mjs';

const dist = join(root, 'dist');

/** Builds the page where it is missing or older than its sources; says whether it did. Throws with the builder's words. */
export async function buildPage({ show }) {
  const fingerprint = sourcesFingerprint();
  if (isBuilt(PAGE_STAMP, fingerprint)) return false;
  const fresh = join(dist, `.page-${process.pid}`);
  await runVite(['build', '--outDir', fresh, '--emptyOutDir'], show, fresh);
  for (const name of readdirSync(dist)) {
    if (name !== 'cli' && !name.startsWith('.')) rmSync(join(dist, name), { recursive: true, force: true });
  }
  for (const name of readdirSync(fresh)) renameSync(join(fresh, name), join(dist, name));
  rmSync(fresh, { recursive: true });
  markBuilt(PAGE_STAMP, fingerprint);
  return true;
}

/** Builds the command line where it is missing or older than its sources. Throws with the builder's words. */
export async function buildCommandLine({ show }) {
  const fingerprint = sourcesFingerprint();
  if (isBuilt(COMMAND_LINE_STAMP, fingerprint)) return false;
  const fresh = join(dist, `.cli-${process.pid}`);
  await runVite(['build', '--mode', 'cli', '--outDir', fresh, '--emptyOutDir'], show, fresh);
  mkdirSync(join(dist, 'cli'), { recursive: true });
  renameSync(join(fresh, 'poleward.js'), join(dist, 'cli', 'poleward.js'));
  rmSync(fresh, { recursive: true });
  markBuilt(COMMAND_LINE_STAMP, fingerprint);
  return true;
}

async function runVite(viteArguments, show, fresh) {
  mkdirSync(dist, { recursive: true });
  const { status, printed } = await run('vite', viteArguments, { show });
  if (status === 0) return;
  rmSync(fresh, { recursive: true, force: true });
  throw new Error(`the build did not succeed\n${printed}`.trimEnd());
}

if (isEntryPoint(import.meta.url)) {
  installMissing();
  const built = [await buildPage({ show: true }), await buildCommandLine({ show: true })];
  if (!built.includes(true)) process.stdout.write('dist is up to date.\n');
}
