/**
 * From an edit to the new matrices on the screen, in Chromium on the built page: a parameter's value is typed, and the frame
 * that shows the new system matrix is waited for.
 */

import { execFileSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Page } from 'playwright/test';
import type { Block, Diagram, Wire } from '../../src/diagram/index.ts';
import type { Benchmark } from './bench.ts';
import { randomDrawing } from './random-drawing.ts';

const SIZES = [20, 50, 200, 500, 1000];
const EDITS = 25;
const COLUMNS = 40;

/** A random drawing behind one loop of its own, whose gain k is the first entry of the system matrix. */
function drawingOf(size: number): Diagram {
  const random = randomDrawing({ blocks: size - 2, seed: 7 });
  const own: Block[] = [
    { id: 'x_k', kind: 'integrator' },
    { id: 'g_k', kind: 'gain', gain: 'k' },
  ];
  const wires: Wire[] = [
    { from: ['x_k', 0], to: ['g_k', 0] },
    { from: ['g_k', 0], to: ['x_k', 0] },
  ];
  const blocks = [...own, ...random.blocks].map(
    (block, i): Block => ({
      ...block,
      at: [140 * (i % COLUMNS), 100 * Math.floor(i / COLUMNS)],
    }),
  );
  return { ...random, parameters: [{ name: 'k', value: '-1' }], blocks, wires: [...wires, ...random.wires] };
}

/** Opens the page on the drawing and waits for its matrix. */
async function open(page: Page, address: string, size: number): Promise<void> {
  const file = join(tmpdir(), `poleward-bench-${size}.poleward.json`);
  writeFileSync(file, JSON.stringify(drawingOf(size)));
  await page.goto(address);
  await page.getByRole('button', { name: 'Drawings' }).click();
  await page.getByLabel("Drawing's file").setInputFiles(file);
  await page.getByLabel('Value of k', { exact: true }).waitFor();
  await page.waitForTimeout(1500);
}

/** Milliseconds from the key to the frame with the new entry, one for each edit. */
function editTimes(page: Page): Promise<number[]> {
  return page.evaluate(async edits => {
    const field = document.querySelector<HTMLInputElement>('[aria-label="Value of k"]');
    const region = document.querySelector('.results');
    if (field === null || region === null) throw new Error('the page has no field or no results');
    const times: number[] = [];
    for (let edit = 0; edit < edits; edit++) {
      const value = 1001 + edit;
      field.focus();
      field.value = `-${value}`;
      const shown = () => Array.from(region.querySelectorAll('td')).some(cell => cell.textContent === `−${value}`);
      const start = performance.now();
      const done = new Promise<void>(resolve => {
        const observer = new MutationObserver(() => {
          if (!shown()) return;
          observer.disconnect();
          requestAnimationFrame(() => resolve());
        });
        observer.observe(region, { childList: true, subtree: true, characterData: true });
      });
      field.dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter', bubbles: true }));
      await done;
      times.push(performance.now() - start);
      await new Promise(resolve => setTimeout(resolve, 120));
    }
    return times;
  }, EDITS);
}

/** What is not bundled into the benchmark, since it looks for its own files beside itself. */
async function surroundings() {
  const address = (name: string) => pathToFileURL(join(process.cwd(), name)).href;
  const build: typeof import('../../.tools/build.mjs') = await import(/* @vite-ignore */ address('.tools/build.mjs'));
  const server: typeof import('../../.tools/static-server.mjs') = await import(
    /* @vite-ignore */ address('.tools/static-server.mjs')
  );
  const { chromium }: typeof import('playwright/test') = await import(
    /* @vite-ignore */ address('node_modules/playwright/test.mjs')
  );
  const executablePath = execFileSync(process.execPath, ['.tools/find-chromium.mjs'], { encoding: 'utf8' }).trim();
  const browser = await chromium.launch({ executablePath, args: ['--no-sandbox', '--disable-gpu', '--disable-quic'] });
  return { buildPage: build.buildPage, serve: server.serve, browser };
}

async function inChromium(): Promise<readonly string[]> {
  const { buildPage, serve, browser } = await surroundings();
  await buildPage({ show: false });
  const server = await serve(join(process.cwd(), 'dist'), { port: 0, host: '127.0.0.1' });
  const lines = [
    '| blocks | least ms | median ms | 90 % within ms |',
    '| -----: | -------: | --------: | -------------: |',
  ];
  try {
    for (const size of SIZES) {
      const page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
      await open(page, `http://127.0.0.1:${server.port}/`, size);
      const times = (await editTimes(page)).sort((a, b) => a - b);
      const at = (share: number) => (times[Math.floor(share * (times.length - 1))] ?? 0).toFixed(1);
      lines.push(`| ${size} | ${at(0)} | ${at(0.5)} | ${at(0.9)} |`);
      await page.close();
    }
  } finally {
    await browser.close();
    await server.close();
  }
  return [lines.join('\n'), 'Goals: within 16 ms at 200 blocks, within 50 ms at 1,000.'];
}

const benchmark: Benchmark = {
  title: 'From an edit to new matrices on the screen',
  note: 'Chromium, the built page: key pressed, edit, worker, new system matrix, next frame. Degenerate: none of its own; each drawing has loops.',
  families: [],
  remarks: inChromium,
};

export default benchmark;
