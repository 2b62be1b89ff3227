/**
 * The command line from a checkout: `npm run -s poleward -- derive FILE`. Builds it first where it is missing or older than
 * its sources, without a word on standard output, then becomes it.
 */

import { COMMAND_LINE_STAMP, isBuilt, sourcesFingerprint } from './project.mjs';

if (!isBuilt(COMMAND_LINE_STAMP, sourcesFingerprint())) await build();
if (process.exitCode === undefined) await import('../dist/cli/poleward.js');

async function build() {
  try {
    const { installMissing } = await import('./install-missing.mjs');
    const { buildCommandLine } = await import('./build.mjs');
    installMissing();
    await buildCommandLine({ show: false });
  } catch (error) {
    process.stderr.write(`The command line could not be built: ${error.message}\n`);
    process.exitCode = 1;
  }
}
