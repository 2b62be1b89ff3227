/**
 * The command line from a checkout: `npm run -s poleward -- derive FILE`. Builds it first where it is missing or older than
 * its sources, without a word on standard output, then becomes it.
 */

import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { buildCommandLine, isCommandLineBuilt } from './build.mjs';
import { installMissing } from './install-missing.mjs';
import { root } from './project.mjs';

try {
  if (!isCommandLineBuilt()) {
    installMissing();
    await buildCommandLine({ show: false });
  }
  await import(pathToFileURL(join(root, 'dist', 'cli', 'poleward.js')).href);
} catch (error) {
  process.stderr.write(`The command line could not be built: ${error.message}\n`);
  process.exitCode = 1;
}
