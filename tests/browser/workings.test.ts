/** The derivation line by line under its tab, and the report from the dialog. */

import { readFile } from 'node:fs/promises';
import { expect, test } from 'playwright/test';
import { blocks, drawWire, openEmptySheet, openWorkedDrawing, writeBlocks } from './sheet-page.ts';

test('the workings show the loop and its solution in the notation that is chosen', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '+-', 'K', '>y');
  await drawWire(blocks(page).nth(2), 0, blocks(page).nth(1), 1);
  const tab = page.getByRole('tab', { name: 'Workings' });
  await tab.focus();
  await tab.press('Enter');
  const panel = page.getByRole('tabpanel', { name: 'Workings' });
  await expect(panel.getByRole('heading', { name: 'Its solution' })).toBeVisible();
  await expect(panel.getByRole('heading', { level: 3 }).first()).toHaveText('As read off the drawing');
  await page.getByRole('group', { name: 'Entries as' }).getByText('symbols').click();
  await expect(panel.locator('mfrac').last()).toHaveText('K1+K');
  await expect(panel.getByRole('button', { name: 'Copy as plain text' })).toBeVisible();
});

test('the report is saved from the dialog', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('button', { name: 'Export…' }).click();
  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Save Report (HTML)' }).click();
  const text = await readFile(await (await download).path(), 'utf8');
  expect(text).toContain('<h2>Workings</h2>');
  expect(text).toContain('<svg ');
});
