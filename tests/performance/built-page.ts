/**
 * The built page in Chromium, for benchmarks that measure what the hand sees: build, serve, open a drawing, close. Frames
 * are timed inside the page.
 */

import { execFileSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Browser, Page } from 'playwright/test';
import type { Block, Diagram, Wire } from '../../src/diagram/index.ts';
import { randomDrawing } from './random-drawing.ts';

const COLUMNS = 40;

const onRaster = (blocks: readonly Block[]): Block[] =>
  blocks.map((block, i) => ({ ...block, at: [140 * (i % COLUMNS), 100 * Math.floor(i / COLUMNS)] }));

/** A random drawing behind one loop of its own, whose gain k is the first entry of the system matrix, on a plain raster. */
export function drawingWithParameter(size: number): Diagram {
  const random = randomDrawing({ blocks: size - 2, seed: 7 });
  const own: Block[] = [
    { id: 'x_k', kind: 'integrator' },
    { id: 'g_k', kind: 'gain', gain: 'k' },
  ];
  const wires: Wire[] = [
    { from: ['x_k', 0], to: ['g_k', 0] },
    { from: ['g_k', 0], to: ['x_k', 0] },
  ];
  const blocks = onRaster([...own, ...random.blocks]);
  return { ...random, parameters: [{ name: 'k', value: '-1' }], blocks, wires: [...wires, ...random.wires] };
}

/**
 * The same random drawing behind x' = k (u − x), y = x: the first input and output, so that the step response shown first
 * is that of the parameter k.
 */
export function drawingWithStep(size: number): Diagram {
  const random = randomDrawing({ blocks: size - 5, seed: 7 });
  const own: Block[] = [
    { id: 'r_k', kind: 'input' },
    { id: 'e_k', kind: 'summer', signs: '+-' },
    { id: 'g_k', kind: 'gain', gain: 'k' },
    { id: 'x_k', kind: 'integrator' },
    { id: 'q_k', kind: 'output' },
  ];
  const wires: Wire[] = [
    { from: ['r_k', 0], to: ['e_k', 0] },
    { from: ['x_k', 0], to: ['e_k', 1] },
    { from: ['e_k', 0], to: ['g_k', 0] },
    { from: ['g_k', 0], to: ['x_k', 0] },
    { from: ['x_k', 0], to: ['q_k', 0] },
  ];
  const blocks = onRaster([...own, ...random.blocks]);
  return { ...random, parameters: [{ name: 'k', value: '1' }], blocks, wires: [...wires, ...random.wires] };
}

/** Opens the page on a drawing that has the parameter k, and waits until it stands still. */
export async function openDrawing(page: Page, address: string, drawing: Diagram): Promise<void> {
  const file = join(tmpdir(), `poleward-bench-${drawing.blocks.length}.poleward.json`);
  writeFileSync(file, JSON.stringify(drawing));
  await page.goto(address);
  await page.getByRole('button', { name: 'Drawings' }).click();
  await page.getByLabel("Drawing's file").setInputFiles(file);
  await page.getByLabel('Value of k', { exact: true }).waitFor();
  await page.waitForTimeout(1500);
}

/** Builds and serves the page, hands browser and address over, and closes both afterwards. */
export async function onBuiltPage<T>(work: (browser: Browser, address: string) => Promise<T>): Promise<T> {
  const { buildPage, serve, browser } = await surroundings();
  try {
    await buildPage({ show: false });
    const server = await serve(join(process.cwd(), 'dist'), { port: 0, host: '127.0.0.1' });
    try {
      return await work(browser, `http://127.0.0.1:${server.port}/`);
    } finally {
      await server.close();
    }
  } finally {
    await browser.close();
  }
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
