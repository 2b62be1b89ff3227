/** Blocks folded into a group and unfolded again, by key: the model stays what it was. */

import { expect, type Page, test } from 'playwright/test';
import { blocks, drawWire, openEmptySheet, writeBlocks } from './sheet-page.ts';

const transfer = (page: Page) =>
  page.getByRole('region', { name: 'Transfer function', exact: true }).locator('math').first();

test('a loop’s plant is folded and unfolded, and the transfer function stays', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '+-', '3', '1/s x', '>y');
  await drawWire(blocks(page).nth(3), 0, blocks(page).nth(1), 1);
  await expect(transfer(page)).toHaveText(/3.*s.*3/);
  const before = (await transfer(page).textContent()) ?? '';
  await blocks(page).nth(2).click();
  await blocks(page)
    .nth(3)
    .click({ modifiers: ['Control'] });
  await page.keyboard.press('Alt+g');
  await expect(blocks(page)).toHaveCount(4);
  await expect(transfer(page)).toHaveText(before);
  await page.keyboard.press('Alt+Shift+g');
  await expect(blocks(page)).toHaveCount(5);
  await expect(transfer(page)).toHaveText(before);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(blocks(page)).toHaveCount(4);
});

test('an input is not folded, and the page says why', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '3');
  await page.keyboard.press('Escape');
  await blocks(page).nth(0).click();
  await page.keyboard.press('Alt+g');
  await expect(page.getByText('Input r: inputs and outputs of a sheet stay outside a group.')).toBeVisible();
});
