/** Runs the packages' own commands: vite, vitest, playwright. */

import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { stripVTControlCharacters } from 'node:util';
import { root } from './project.mjs';

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
