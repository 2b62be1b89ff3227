/**
 * Finds a Chromium for the browser tests, and gets one where there is none. Looks at CHROMIUM_PATH, then along PATH, then at
 * Playwright's own copy; then has Playwright fetch its copy; then, as root with apt, installs Debian's package.
 * `node .tools/find-chromium.mjs` prints its path; so does `findChromium()` for another tool.
 */

import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { isEntryPoint, root } from './project.mjs';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome'];
/** Long enough for a browser of 200 MB over a slow line, short enough to notice a line that is closed. */
const FETCH_LIMIT_MS = 5 * 60_000;

/** The path of a Chromium that tells its version; throws with what to do where none can be had. */
export async function findChromium() {
  return fromEnvironment() ?? fromPath() ?? (await fromPlaywright()) ?? (await fetched()) ?? fromApt() ?? giveUp();
}

function fromEnvironment() {
  const path = process.env.CHROMIUM_PATH;
  if (path === undefined || path === '') return null;
  if (tellsVersion(path)) return path;
  throw new Error(`CHROMIUM_PATH is ${path}, which does not run as a Chromium. Correct it or unset it.`);
}

function fromPath() {
  const folders = (process.env.PATH ?? '').split(delimiter).filter(Boolean);
  const candidates = NAMES.flatMap(name => folders.map(folder => join(folder, name)));
  return candidates.find(path => existsSync(path) && tellsVersion(path)) ?? null;
}

async function fromPlaywright() {
  const { chromium } = await import('playwright');
  const path = chromium.executablePath();
  return existsSync(path) && tellsVersion(path) ? path : null;
}

async function fetched() {
  say('No Chromium was found; asking Playwright to fetch its own …');
  spawnSync(process.execPath, [join(root, 'node_modules/playwright/cli.js'), 'install', 'chromium'], {
    stdio: ['ignore', 2, 2],
    timeout: FETCH_LIMIT_MS,
  });
  return fromPlaywright();
}

function fromApt() {
  const isRoot = process.getuid?.() === 0;
  if (!isRoot || spawnSync('apt-get', ['--version'], { stdio: 'ignore' }).status !== 0) return null;
  say("Installing Debian's chromium …");
  const options = { stdio: ['ignore', 2, 2], env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } };
  const updated = spawnSync('apt-get', ['update'], options).status === 0;
  if (updated) spawnSync('apt-get', ['install', '-y', '--no-install-recommends', 'chromium'], options);
  return fromPath();
}

function giveUp() {
  throw new Error(
    'The browser tests need Chromium and none could be found or fetched. Install it (Debian: apt-get install chromium), or set CHROMIUM_PATH to one.',
  );
}

function tellsVersion(path) {
  return spawnSync(path, ['--version'], { stdio: 'ignore', timeout: 20_000 }).status === 0;
}

function say(text) {
  process.stderr.write(`${text}\n`);
}

if (isEntryPoint(import.meta.url)) {
  try {
    process.stdout.write(`${await findChromium()}\n`);
  } catch (error) {
    say(error.message);
    process.exitCode = 1;
  }
}
