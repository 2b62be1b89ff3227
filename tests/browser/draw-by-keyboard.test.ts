/** The same job without a mouse: placing, editing, wiring, undoing and exporting by keys alone. */

import { expect, test } from 'playwright/test';
import { block, blocks, expectMatrix, openEmptySheet } from './sheet-page.ts';

test('a loop is placed, wired, edited and exported by keys alone', async ({ page }) => {
  await openEmptySheet(page);
  const line = page.getByLabel('Write a block', { exact: true });
  await line.focus();
  for (const text of ['r>', '+-', '2', '1/s x', '>y']) {
    await page.keyboard.type(text);
    await page.keyboard.press('Enter');
  }
  await expect(blocks(page)).toHaveCount(5);

  await block(page, 'integrator x').focus();
  await page.keyboard.press('w');
  await block(page, 'summing point sum').focus();
  await page.keyboard.press('Enter');
  // x' = 2 (r − x), y = x
  await expectMatrix(page, [
    ['−2', '2'],
    ['1', '0'],
  ]);

  await block(page, 'gain 2').focus();
  await page.keyboard.press('Enter');
  await page.keyboard.type('3/4');
  await page.keyboard.press('Enter');
  await expectMatrix(page, [
    ['−3/4', '3/4'],
    ['1', '0'],
  ]);
  await expect(block(page, 'gain 3/4')).toBeFocused();

  await page.keyboard.press('ArrowDown');
  await page.keyboard.press('Control+z');
  await page.keyboard.press('Control+z');
  await expectMatrix(page, [
    ['−2', '2'],
    ['1', '0'],
  ]);

  await page.keyboard.press('Control+e');
  const dialog = page.getByRole('dialog', { name: 'Export' });
  await expect(dialog).toBeVisible();
  const save = dialog.getByRole('button', { name: 'Save Comma-separated values' });
  const download = page.waitForEvent('download');
  await save.focus();
  await page.keyboard.press('Enter');
  expect((await download).suggestedFilename()).toMatch(/\.csv$/);
  await page.keyboard.press('Escape');
  await expect(dialog).toBeHidden();
});

test('parts are placed by their letters and other characters begin the write-a-block line', async ({ page }) => {
  await openEmptySheet(page);
  await page.locator('.react-flow__pane').click();
  await page.keyboard.press('u');
  await page.keyboard.press('Escape');
  await page.keyboard.press('i');
  await page.keyboard.type('level');
  await page.keyboard.press('Enter');
  await expect(block(page, 'integrator level')).toBeFocused();
  await page.keyboard.press('y');
  await page.keyboard.press('Escape');
  await expectMatrix(page, [
    ['0', '1'],
    ['1', '0'],
  ]);
  await page.keyboard.press('Escape');
  await page.keyboard.type('7/3');
  await expect(page.getByLabel('Write a block', { exact: true })).toHaveValue('7/3');
  await page.keyboard.press('Enter');
  await expect(block(page, 'gain 7/3')).toBeVisible();
});
