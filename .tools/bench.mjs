/**
 * `npm run bench [-- FILTER]`: the benchmarks of tests/performance, one table each. Each is bundled as the program itself is
 * built, so that what is measured is what runs. What a benchmark file holds stands in tests/performance/bench.ts.
 */

import { mkdirSync, readdirSync, rmSync } from 'node:fs';
import { cpus } from 'node:os';
import { join } from 'node:path';
import { performance } from 'node:perf_hooks';
import { pathToFileURL } from 'node:url';
import { installMissing } from './install-missing.mjs';
import { root } from './project.mjs';
import { run } from './run.mjs';

const folder = join(root, 'tests', 'performance');
const bundles = join(root, '.cache', 'bench');
const WARM_UP_MS = 300;
const MEASURE_MS = 1000;
const FEWEST_RUNS = 5;
const MOST_RUNS = 2000;

/** Runs `work` for a while unmeasured, then measured: milliseconds a run, ascending. */
async function measure(work) {
  const warmUntil = performance.now() + WARM_UP_MS;
  do await work();
  while (performance.now() < warmUntil);
  const times = [];
  const until = performance.now() + MEASURE_MS;
  while (times.length < FEWEST_RUNS || (performance.now() < until && times.length < MOST_RUNS)) {
    const start = performance.now();
    await work();
    times.push(performance.now() - start);
  }
  return times.sort((a, b) => a - b);
}

/** Three significant digits, no exponent. */
function milliseconds(value) {
  return value >= 100 ? value.toFixed(0) : value.toPrecision(3);
}

/** Columns of one width each, numbers to the right. */
function printTable(rows) {
  const widths = rows[0].map((_, column) => Math.max(...rows.map(row => row[column].length)));
  for (const row of rows) {
    const cells = row.map((cell, column) => (column === 0 ? cell.padEnd(widths[0]) : cell.padStart(widths[column])));
    process.stdout.write(`| ${cells.join(' | ')} |\n`);
    if (row === rows[0]) process.stdout.write(`| ${widths.map(width => '-'.repeat(width)).join(' | ')} |\n`);
  }
}

async function runBenchmark({ title, note, families, remarks }) {
  process.stdout.write(`\n## ${title}\n${note === undefined ? '' : `${note}\n`}\n`);
  const rows = [['family', 'size', 'least ms', 'median ms', 'most ms', 'runs']];
  for (const { name, sizes, prepare } of families) {
    for (const size of sizes) {
      const times = await measure(await prepare(size));
      const [least, median, most] = [times[0], times[times.length >> 1], times.at(-1)].map(milliseconds);
      rows.push([name, String(size), least, median, most, String(times.length)]);
    }
  }
  printTable(rows);
  const lines = (await remarks?.()) ?? [];
  process.stdout.write(lines.map(line => `\n${line}\n`).join(''));
}

installMissing();
const filters = process.argv.slice(2);
const names = readdirSync(folder)
  .filter(name => name.endsWith('.bench.ts') && (filters.length === 0 || filters.some(filter => name.includes(filter))))
  .sort();
if (names.length === 0) {
  process.stderr.write('No benchmark of that name in tests/performance.\n');
  process.exitCode = 1;
}
const date = new Date().toISOString().slice(0, 10);
process.stdout.write(
  `${date}, Node ${process.version}, ${cpus()[0]?.model ?? 'unknown processor'}, ${cpus().length} cores\n`,
);
mkdirSync(bundles, { recursive: true });
for (const name of names) {
  const out = join(bundles, name.replace('.bench.ts', ''));
  rmSync(out, { recursive: true, force: true });
  const { status, printed } = await run(
    'vite',
    ['build', '--mode', 'cli', '--ssr', join(folder, name), '--outDir', out],
    {
      show: false,
    },
  );
  if (status !== 0) {
    process.stderr.write(`${name} could not be built\n${printed}\n`);
    process.exitCode = 1;
    continue;
  }
  const built = readdirSync(out).find(file => file.endsWith('.js'));
  const { default: benchmark } = await import(pathToFileURL(join(out, built)).href);
  await runBenchmark(benchmark);
}
