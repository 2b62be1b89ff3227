/** The page of keys, one key away, and the keys that were easily mixed up. */

import { expect, test } from 'playwright/test';
import { block, blocks, openEmptySheet, openWorkedDrawing, writeBlocks } from './sheet-page.ts';

test('the page of keys lists parts, commands, fields and what the hand does', async ({ page }) => {
  await openEmptySheet(page);
  await page.locator('.react-flow__pane').click();
  await page.keyboard.press('?');
  const dialog = page.getByRole('dialog', { name: 'Keys' });
  const row = (group: string, key: string) =>
    dialog
      .getByRole('table', { name: group })
      .getByRole('row')
      .filter({ has: page.getByText(key, { exact: true }) });
  await expect(row('Place a block', 'E')).toContainText('limiter');
  await expect(row('On a wire', 'C')).toContainText('cut it to measure margins there');
  await expect(row('On the sheet', 'W')).toContainText('wire the selected block');
  await expect(row('On the sheet', 'Shift+←  Shift+→  Shift+↑  Shift+↓')).toContainText('by five squares');
  await expect(row('Everywhere', 'Ctrl+Y  Ctrl+Shift+Z')).toContainText('redo');
  await expect(row('In the write-a-block line', '@sum-')).toContainText('a wire to the block sum with minus');
});

test('E places a limiter whatever is selected, into a selected wire too, and C only ever cuts a wire', async ({
  page,
}) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '>y');
  await page.locator('.sheet').focus();
  await page.keyboard.press('Escape');
  await page.keyboard.press('c');
  await expect(blocks(page)).toHaveCount(2);
  await block(page, 'input u').focus();
  await page.keyboard.press('n');
  await page.keyboard.press('c');
  await expect(page.locator('.notice')).toHaveText('Cut the wire: its margins are under Frequency.');
  await page.keyboard.press('c');
  await expect(page.locator('.notice')).toHaveText('Took the cut out.');
  await page.keyboard.press('e');
  await expect(page.locator('.notice')).toContainText('Put limiter');
  await expect(page.locator('.react-flow__edge')).toHaveCount(2);
  await expect(blocks(page)).toHaveCount(3);
});

test('undo, redo and export count wherever the focus is, but in a text field', async ({ page }) => {
  await openWorkedDrawing(page);
  await block(page, 'gain K_p').focus();
  await page.keyboard.press('Delete');
  await expect(block(page, 'gain K_p')).toHaveCount(0);
  await page.getByRole('button', { name: 'Fit', exact: true }).focus();
  await page.keyboard.press('Control+z');
  await expect(block(page, 'gain K_p')).toBeVisible();
  await page.keyboard.press('Control+Shift+z');
  await expect(block(page, 'gain K_p')).toHaveCount(0);
  await page.keyboard.press('Control+e');
  await expect(page.getByRole('dialog', { name: 'Export' })).toBeVisible();
});
