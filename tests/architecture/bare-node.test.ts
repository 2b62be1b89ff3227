/**
 * The core loads in Node alone: bundled as it is, in a process of its own, with every global of the browser trapped. A room
 * that reads one while loading is caught with its name.
 */

import { execFileSync } from 'node:child_process';
import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { PORTABLE_ROOMS } from './rooms.ts';
import { sourceFiles } from './source-files.ts';

const root = fileURLToPath(new URL('../../', import.meta.url));
/** Inside the project, so that the libraries of the core are found from there. */
const folder = `${root}/.cache/bare-node-${process.pid}`;

const rooms = PORTABLE_ROOMS.filter(room => sourceFiles().some(({ path }) => path === `src/${room}/index.ts`));

/** Records who touches a global of the browser, where the one who does is code of the bundle and not a library. */
const TRAPS = `
const touched = [];
for (const name of ['window', 'self', 'document', 'navigator', 'location', 'localStorage', 'indexedDB', 'HTMLElement',
  'DOMParser', 'requestAnimationFrame', 'Worker', 'postMessage', 'XMLHttpRequest', 'matchMedia', 'history']) {
  Object.defineProperty(globalThis, name, { configurable: true, get() {
    if ((new Error().stack.split('\\n')[2] ?? '').includes('bundle.mjs')) touched.push(name);
    return undefined;
  } });
}
`;

/** Bundles what `entry` imports and loads it; answers what the process printed, as JSON. */
async function load(entry: string): Promise<{ touched: string[]; names: string[] }> {
  mkdirSync(folder, { recursive: true });
  writeFileSync(`${folder}/entry.ts`, entry);
  await build({
    configFile: false,
    logLevel: 'error',
    root,
    build: {
      ssr: `${folder}/entry.ts`,
      outDir: folder,
      emptyOutDir: false,
      rolldownOptions: { output: { entryFileNames: 'bundle.mjs' } },
    },
  });
  const program = `${TRAPS}
    const { default: loaded } = await import('./bundle.mjs');
    process.stdout.write(JSON.stringify({ touched, names: Object.keys(loaded) }));`;
  writeFileSync(`${folder}/load.mjs`, program);
  return JSON.parse(execFileSync(process.execPath, [`${folder}/load.mjs`], { encoding: 'utf8' }));
}

beforeAll(() => rmSync(folder, { recursive: true, force: true }));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

test('every room of the core loads without the browser', async () => {
  const imports = rooms.map(room => `import * as ${room} from '${root}/src/${room}/index.ts';`);
  const entry = `${imports.join('\n')}\nexport default { ${rooms.join(', ')} };`;
  expect(await load(entry)).toEqual({ touched: [], names: rooms });
});

test('a room that asks for the document is caught', async () => {
  const entry = 'const found = typeof document;\nexport default { found };';
  expect(await load(entry)).toEqual({ touched: ['document'], names: ['found'] });
});
