/** The built command line as a process of its own, start of Node included. */

import { spawnSync } from 'node:child_process';
import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { writeDiagram } from '../../src/diagram/index.ts';
import type { Benchmark } from './bench.ts';
import { randomDrawing } from './random-drawing.ts';

/** Runs Node with these arguments; what it printed. Throws unless the process ends well. */
function node(args: readonly string[]): string {
  const { status, stdout, stderr } = spawnSync(process.execPath, args, { encoding: 'utf8', maxBuffer: 1 << 28 });
  if (status !== 0) throw new Error(`node ${args.join(' ')} ended with ${status}: ${stderr}`);
  return stdout;
}

async function commandLine(): Promise<string> {
  const address = pathToFileURL(join(process.cwd(), '.tools', 'build.mjs')).href;
  const build: typeof import('../../.tools/build.mjs') = await import(/* @vite-ignore */ address);
  await build.buildCommandLine({ show: false });
  return join(process.cwd(), 'dist', 'cli', 'poleward.js');
}

const benchmark: Benchmark = {
  title: 'The command line',
  note: 'derive on a file, the whole process. Beside it Node alone, which no program undercuts. Goal: 250 ms on a small drawing.',
  families: [
    {
      name: 'derive, blocks',
      sizes: [5, 20, 50, 200, 1000],
      prepare: async size => {
        const program = await commandLine();
        const file = join(mkdtempSync(join(tmpdir(), 'poleward-bench-')), `${size}.poleward.json`);
        writeFileSync(file, writeDiagram(randomDrawing({ blocks: size, seed: 7 })));
        return () => node([program, 'derive', file]);
      },
    },
    { name: 'Node alone', sizes: [0], prepare: () => () => node(['-e', '0']) },
  ],
};

export default benchmark;
