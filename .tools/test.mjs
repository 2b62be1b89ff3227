/**
 * `npm test [-- FILTER]`: every test there is. Installs what is missing, makes sure of a Chromium, runs the tests in Node,
 * builds, weighs the first load, runs the tests in the browser. Ends in one line, `N passed, N failed`, over both; the exit
 * status is not 0 where a test failed, a runner broke off, or nothing ran. FILTER is part of the path of a test file.
 */

import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { buildCommandLine, buildPage } from './build.mjs';
import { findChromium } from './find-chromium.mjs';
import { installMissing } from './install-missing.mjs';
import { root } from './project.mjs';
import { run } from './run.mjs';
import { weighFirstLoad } from './size.mjs';

const filters = process.argv.slice(2);
const reports = join(root, '.cache', 'test-reports');
/** What went wrong beside the tests: each counts as one failure. */
const troubles = [];

/** Runs one stage; what it throws is a trouble, and the stages after it still run where they can. */
async function stage(name, work) {
  process.stdout.write(`\n── ${name}\n`);
  try {
    return await work();
  } catch (error) {
    troubles.push(`${name}: ${error.message}`);
    process.stdout.write(`${error.message}\n`);
    return null;
  }
}

/** The report that a runner wrote; throws where it broke off before it could write one. */
function readReport(path, runner) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    throw new Error(`${runner} broke off without a report`);
  }
}

/** Runs a runner and counts. Throws where it reports no failure and yet did not succeed. */
async function count(runner, report, commandArguments, environment, countsOf) {
  rmSync(report, { force: true });
  const { status } = await run(runner, commandArguments, { environment });
  const counts = countsOf(readReport(report, runner));
  if (status !== 0 && counts.failed === 0 && counts.passed + counts.skipped > 0) {
    troubles.push(`${runner} ended with status ${status} although no test failed`);
  }
  if (counts.passed + counts.failed === 0 && filters.length === 0) troubles.push(`${runner} ran no test`);
  return counts;
}

function testsInNode() {
  const report = join(reports, 'node.json');
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  return count('vitest', report, ['run', '--passWithNoTests', ...reporters, ...filters], {}, found => {
    // A file that cannot even be loaded holds no test that failed; it counts as one.
    const unloadable = found.testResults.filter(file => file.status === 'failed' && file.assertionResults.length === 0);
    return {
      passed: found.numPassedTests,
      failed: found.numFailedTests + unloadable.length,
      skipped: found.numPendingTests + found.numTodoTests,
    };
  });
}

function testsInBrowser(chromium) {
  const report = join(reports, 'browser.json');
  const environment = { CHROMIUM_PATH: chromium, PLAYWRIGHT_JSON_OUTPUT_FILE: report, PLAYWRIGHT_FORCE_TTY: '0' };
  const fixed = ['test', '-c', 'tests/browser', '--pass-with-no-tests', '--reporter=list,json'];
  return count('playwright', report, [...fixed, ...filters], environment, ({ stats, errors }) => ({
    passed: stats.expected,
    failed: stats.unexpected + stats.flaky + errors.length,
    skipped: stats.skipped,
  }));
}

/** The closing line; says before it what went wrong beside the tests. */
function close(counts) {
  const sum = key => counts.reduce((total, each) => total + (each?.[key] ?? 0), 0);
  const passed = sum('passed');
  const skipped = sum('skipped');
  if (passed + sum('failed') === 0 && troubles.length === 0) troubles.push('no test ran');
  const failed = sum('failed') + troubles.length;
  process.stdout.write('\n');
  for (const trouble of troubles) process.stdout.write(`Not a test, yet a failure: ${trouble.split('\n')[0]}\n`);
  process.stdout.write(`${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}\n`);
  process.exitCode = failed === 0 && skipped === 0 ? 0 : 1;
}

async function main() {
  mkdirSync(reports, { recursive: true });
  const isInstalled = await stage('packages', () => {
    installMissing();
    return true;
  });
  if (isInstalled === null) return close([]);
  const chromium = await stage('Chromium', findChromium);
  const inNode = await stage('tests in Node', testsInNode);
  const isBuilt = await stage('build', async () => {
    await buildPage({ show: false });
    await buildCommandLine({ show: false });
    return true;
  });
  if (isBuilt) await stage('size of the first load', weighFirstLoad);
  const canBrowse = chromium !== null && isBuilt;
  const inBrowser = canBrowse ? await stage('tests in the browser', () => testsInBrowser(chromium)) : null;
  return close([inNode, inBrowser]);
}

await main();
