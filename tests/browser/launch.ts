/** How the browser tests start Chromium: the one that `node .tools/find-chromium.mjs` finds, quiet towards the network. */

import { execFileSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Options for Playwright's launch. The path is looked for once and then handed to the workers in the environment. */
export function launchOptions(): { executablePath: string; args: string[] } {
  if (!process.env['CHROMIUM_PATH']) {
    const script = fileURLToPath(new URL('../../.tools/find-chromium.mjs', import.meta.url));
    process.env['CHROMIUM_PATH'] = execFileSync(process.execPath, [script], {
      encoding: 'utf8',
      stdio: ['ignore', 'pipe', 'inherit'],
    }).trim();
  }
  return { executablePath: process.env['CHROMIUM_PATH'], args: FLAGS };
}
