/** The write-a-block line: a whole loop typed, names completed, values given, the line at the pointer. */

import { expect, test } from 'playwright/test';
import { block, blocks, expectMatrix, openEmptySheet, writeBlocks } from './sheet-page.ts';

test('a whole loop is typed without leaving the line', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '+', 'K_x = 3.5', '1/s x', '@sum-', '>y');
  await expect(blocks(page)).toHaveCount(5);
  await expect(page.getByLabel('Value of K_x', { exact: true })).toHaveValue('3.5');
  // x' = 7/2 (r − x), y = x
  await expectMatrix(page, [
    ['−7/2', '7/2'],
    ['1', '0'],
  ]);
});

test('the line says what it will place, and completes names by key', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', 'K_p = 0.5');
  const line = page.getByLabel('Write a block', { exact: true });
  const says = page.locator('#write-says');
  await line.fill('K_x');
  await expect(says).toHaveText('Enter places gain K_x, wired from gain K_p. K_x is new: Enter adds it with value 1');
  await line.fill('2*k');
  await expect(page.getByRole('option', { name: 'K_p' })).toBeVisible();
  await line.press('ArrowDown');
  await expect(page.getByRole('option', { name: 'K_p' })).toHaveAttribute('aria-selected', 'true');
  await line.press('Tab');
  await expect(line).toHaveValue('2*K_p');
  await expect(page.getByRole('option')).toHaveCount(0);
  await line.press('Enter');
  await expect(block(page, 'gain 2*K_p')).toBeVisible();
  await line.fill('@nobody');
  await line.press('Enter');
  await expect(says).toHaveText('There is no block nobody. Write the name of one on the sheet.');
});

test('dead time and limiter are written as on paper and placed by key', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', 'e^(-0.5*s)', '-1 .. 1', '>y');
  await expect(page.locator('.react-flow__node').nth(1)).toHaveAttribute('aria-label', /^dead time/);
  await expect(page.locator('.react-flow__node').nth(2)).toHaveAttribute('aria-label', /^limiter/);
  await page.locator('.sheet').focus();
  await page.keyboard.press('Escape');
  await page.keyboard.press('d');
  await expect(blocks(page)).toHaveCount(5);
});

test('the line opens at the pointer when one types over the sheet, Escape gives the focus back', async ({ page }) => {
  await openEmptySheet(page);
  await page.mouse.click(300, 300);
  await page.mouse.move(350, 320);
  await page.keyboard.press('7');
  const line = page.getByLabel('Write a block', { exact: true });
  await expect(line).toBeFocused();
  await expect(line).toHaveValue('7');
  await expect.poll(async () => Math.abs(((await line.boundingBox())?.y ?? 0) - 320)).toBeLessThan(60);
  await page.keyboard.press('Escape');
  await expect(page.locator('.sheet')).toBeFocused();
  await expect(line).toHaveValue('');
  await page.keyboard.press('7');
  await page.keyboard.press('Enter');
  const box = await block(page, 'gain 7').boundingBox();
  expect(Math.abs((box?.y ?? 0) + (box?.height ?? 0) / 2 - 320)).toBeLessThan(60);
});
