/** The tab that shows the transfer function of every input and output at once, kept up to date with the drawing. */

import { expect, test } from 'playwright/test';
import { openEmptySheet, writeBlocks } from './sheet-page.ts';

test('the Transfer tab lists every channel and follows an edit', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '3/(s+2)', '>y');
  await page.getByRole('tab', { name: 'Transfer' }).click();
  const panel = page.getByRole('tabpanel', { name: 'Transfer' });
  await expect(panel.getByRole('term')).toHaveText(['r → y']);
  await expect(panel.locator('math').first()).toHaveText(/3.*s.*\+.*2/);
  await writeBlocks(page, 'w>');
  await expect(panel.getByRole('term')).toHaveText(['r → y', 'w → y']);
});
