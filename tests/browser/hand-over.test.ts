/** What is handed over: files of the matrices and of the drawing, pictures, and the link at a colleague's. */

import { readFile } from 'node:fs/promises';
import { type Download, expect, type Page, test } from 'playwright/test';
import {
  block,
  blocks,
  expectMatrix,
  matrixCell,
  openEmptySheet,
  openWorkedDrawing,
  writeBlocks,
} from './sheet-page.ts';

/** The winch's system matrix, derived by hand: rows ω̇, Ḟ, q̇, Ṫ, F over columns ω, F, q, T, r, v. */
const WINCH = {
  A: [
    [-4, -0.3125, 0, 1.25],
    [3, 0, 0, 0],
    [0, -1, 0, 0],
    [0, -10, 8, -20],
  ],
  B: [
    [0, 0],
    [0, 12],
    [1, 0],
    [10, 0],
  ],
  C: [[0, 1, 0, 0]],
  D: [[0, 0]],
};

async function saved(page: Page, name: RegExp): Promise<Download> {
  const download = page.waitForEvent('download');
  await page.getByRole('dialog', { name: 'Export' }).getByRole('button', { name }).click();
  return download;
}

async function text(download: Download): Promise<string> {
  return readFile(await download.path(), 'utf8');
}

test('the model file holds the matrices that were worked out by hand', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('button', { name: 'Export…' }).click();
  const file = await saved(page, /^Save .*model file/i);
  expect(file.suggestedFilename()).toBe('survey-winch-line-tension.model.json');
  expect(JSON.parse(await text(file))).toMatchObject({ format: 'poleward-model', version: 1, ...WINCH });
});

test('a CSV file names its rows and columns', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('button', { name: 'Export…' }).click();
  const csv = await text(await saved(page, /^Save Comma-separated/));
  expect(csv).toContain('omega');
  expect(csv).toContain('-0.3125');
  expect(csv.split('\r\n').length).toBeGreaterThan(5);
});

test('every format of the table is saved with something in it', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('button', { name: 'Export…' }).click();
  const dialog = page.getByRole('dialog', { name: 'Export' });
  await expect(dialog.getByRole('button', { name: 'Save PNG' })).toBeVisible();
  const buttons = await dialog.getByRole('button', { name: /^Save / }).all();
  expect(buttons.length).toBeGreaterThanOrEqual(10);
  for (const button of buttons) {
    const download = page.waitForEvent('download');
    await button.click();
    const content = await readFile(await (await download).path());
    expect(content.length).toBeGreaterThan(100);
    // Chromium drops what comes after ten downloads in one burst; no hand is as quick.
    await page.waitForTimeout(250);
  }
});

test('a picture is a PNG with ink on it, an SVG names the title', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('button', { name: 'Export…' }).click();
  const png = await readFile(await (await saved(page, /^Save PNG/)).path());
  expect([...png.subarray(0, 8)]).toEqual([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  expect(png.readUInt32BE(16)).toBeGreaterThan(800);
  const svg = await text(await saved(page, /^Save SVG/));
  expect(svg).toContain('Survey winch, line tension');
  expect(svg).not.toMatch(/(href|src)=/);
});

test('plain text is copied to the clipboard', async ({ page, context }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write']);
  await openWorkedDrawing(page);
  await page.getByRole('button', { name: 'Export…' }).click();
  await page.getByRole('button', { name: 'Copy Plain text table' }).click();
  await expect(page.getByRole('status').filter({ hasText: 'Copied' })).toBeVisible();
  const copied = await page.evaluate(() => navigator.clipboard.readText());
  expect(copied).toContain('-5/16');
  expect(copied).toContain('omega');
});

test('a saved drawing is opened again by button and by dropping its file', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '6', '1/s level', '>y');
  await page.getByRole('button', { name: 'Export…' }).click();
  const file = await saved(page, /^Save Diagram file/);
  expect(file.suggestedFilename()).toMatch(/\.poleward\.json$/);
  const path = await file.path();
  await page.keyboard.press('Escape');

  await page.getByRole('button', { name: 'Empty sheet' }).click();
  await expect(blocks(page)).toHaveCount(0);
  await page.getByRole('button', { name: 'Drawings' }).click();
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Open a file…' }).click();
  await (await chooser).setFiles(path);
  await expectMatrix(page, [
    ['0', '6'],
    ['1', '0'],
  ]);

  await page.getByRole('button', { name: 'Empty sheet' }).click();
  await expect(blocks(page)).toHaveCount(0);
  await dropText(page, 'loop.poleward.json', await readFile(path, 'utf8'));
  await expect(block(page, 'integrator level')).toBeVisible();
});

test('the link opens the same drawing in another profile and leaves what was open there alone', async ({
  page,
  context,
  browser,
  baseURL,
}) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write']);
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '6', '1/s level', '>y');
  await page.getByRole('button', { name: 'Share link' }).click();
  await expect(page.getByRole('status').filter({ hasText: /Link copied, [\d,]+ characters/ })).toBeVisible();
  const link = await page.evaluate(() => navigator.clipboard.readText());

  const colleague = await browser.newContext(baseURL === undefined ? {} : { baseURL });
  const there = await colleague.newPage();
  await openEmptySheet(there);
  await writeBlocks(there, '1/s mine');
  await expect(there.getByText(/^kept \d/)).toBeVisible();
  await there.goto(link);
  await expect(block(there, 'integrator level')).toBeVisible();
  await expectMatrix(there, [
    ['0', '6'],
    ['1', '0'],
  ]);
  await there.getByRole('button', { name: 'Drawings' }).click();
  const kept = there.getByRole('table', { name: 'Drawings kept on this device' });
  await kept.getByRole('button', { name: /^Open/ }).first().click();
  await expect(block(there, 'integrator mine')).toBeVisible();
  await colleague.close();
});

test('decimals are exported where decimals are chosen, and the screen keeps its own choice', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('button', { name: 'Export…' }).click();
  const dialog = page.getByRole('dialog', { name: 'Export' });
  expect(await text(await saved(page, /^Save LaTeX/))).toContain('\\frac{5}{16}');
  await dialog.getByRole('radio', { name: 'decimals' }).check();
  const decimals = await text(await saved(page, /^Save LaTeX/));
  expect(decimals).toContain('0.3125');
  expect(decimals).not.toContain('\\frac{5}{16}');
  await page.keyboard.press('Escape');
  await expect(matrixCell(page, 1, 2)).toHaveText('−5/16');
});

async function dropText(page: Page, name: string, content: string): Promise<void> {
  const transfer = await page.evaluateHandle(
    ([file, body]) => {
      const data = new DataTransfer();
      data.items.add(new File([body ?? ''], file ?? ''));
      return data;
    },
    [name, content],
  );
  await page.locator('.page').dispatchEvent('drop', { dataTransfer: transfer });
}
