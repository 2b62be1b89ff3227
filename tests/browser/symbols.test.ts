/** The model in symbols of the parameters: in the table, in the transfer function, in the files. */

import { readFile } from 'node:fs/promises';
import { expect, test } from 'playwright/test';
import { blocks, drawWire, matrixCell, openEmptySheet, openWorkedDrawing, writeBlocks } from './sheet-page.ts';

test('the worked drawing reads in symbols, and stays so while a value changes', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('group', { name: 'Entries as' }).getByText('symbols').click();
  // ω̇ = (T − b ω − R F) / J
  await expect(matrixCell(page, 1, 1).locator('mfrac')).toHaveText('bJ');
  await expect(matrixCell(page, 1, 4).locator('mfrac')).toHaveText('1J');
  await page.getByLabel('Value of J', { exact: true }).fill('2');
  await page.getByLabel('Value of J', { exact: true }).press('Enter');
  await expect(matrixCell(page, 1, 4).locator('mfrac')).toHaveText('1J');
  const transfer = page.getByRole('region', { name: 'Transfer function', exact: true });
  await expect(transfer).toContainText('J');
  await expect(transfer.locator('math').first()).toBeVisible();
});

test('a derived parameter keeps its name until it is asked to be written out', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'w2 = k/m', 'r>', '+-', 'w2', '1/s x', '>y');
  await drawWire(blocks(page).nth(4), 0, blocks(page).nth(2), 1);
  await page.getByRole('group', { name: 'Entries as' }).getByText('symbols').click();
  const table = page.getByRole('region', { name: 'System matrix', exact: true });
  await expect(table.locator('math').first()).toContainText('2');
  await table.getByLabel('write derived parameters out').check();
  await expect(table.locator('mfrac').first()).toHaveText('km');
});

test('where the general expression divides by zero the table says by what', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '+-', '>y', 's', 'L = 0');
  await drawWire(blocks(page).nth(1), 0, blocks(page).nth(3), 0);
  await drawWire(blocks(page).nth(4), 0, blocks(page).nth(1), 1);
  await page.getByRole('group', { name: 'Entries as' }).getByText('symbols').click();
  await expect(page.getByRole('region', { name: 'System matrix', exact: true })).toContainText(
    'The general expressions divide by L, which is zero at the present values',
  );
});

test('the C source is saved from the dialog', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('button', { name: 'Export…' }).click();
  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Save C source' }).click();
  const text = await readFile(await (await download).path(), 'utf8');
  expect(text).toContain('.J = 0.8,');
  expect(text).toContain('void matrices(');
});
