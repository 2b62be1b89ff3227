/** Frequency beside the step response: the channel's curves, a cut put on a wire, its margins read on the page. */

import { expect, type Page, test } from 'playwright/test';
import { blocks, drawWire, openEmptySheet, writeBlocks } from './sheet-page.ts';

/** y = 1 / (s (s + 1)) fed back to e: crossover 0.786 rad/s, phase margin 51.8° (Ogata's and every textbook's second order). */
async function openLoop(page: Page): Promise<void> {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '+-', '1/(s^2+s)', '>y');
  await drawWire(blocks(page).nth(2), 0, blocks(page).nth(1), 1);
}

const panel = (page: Page) => page.getByRole('region', { name: 'Frequency response' });

async function cutFeedback(page: Page): Promise<void> {
  await blocks(page).nth(2).click();
  await page.keyboard.press('n');
  await page.keyboard.press('c');
}

test('a cut by key shows its phase margin in the verdict line and on the sheet, and goes with Undo', async ({
  page,
}) => {
  await openLoop(page);
  await cutFeedback(page);
  await expect(page.locator('footer')).toContainText('cut 1: phase margin 51.8° at 0.786 rad/s');
  await expect(page.locator('.cut-marks text')).toHaveText('cut 1');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(page.locator('.cut-marks')).toHaveCount(0);
  await expect(page.locator('footer')).not.toContainText('cut 1');
});

test('the Frequency tab shows the channel, the loop at the cut with its margins, and takes the cut out', async ({
  page,
}) => {
  await openLoop(page);
  await cutFeedback(page);
  await page.getByRole('tab', { name: 'Frequency' }).click();
  // ωn √(1 − 2ζ² + √((1 − 2ζ²)² + 1)) with ωn = 1, ζ = 1/2
  await expect(panel(page)).toContainText('bandwidth (−3 dB) 1.27 rad/s');
  await panel(page).getByText('cut 1', { exact: true }).first().click();
  const plot = panel(page).getByRole('slider', { name: 'Loop transfer at cut 1' });
  await expect(plot).toHaveAttribute('aria-valuetext', /^0\.786 rad\/s, .* −128\.2°$/);
  await plot.focus();
  await page.keyboard.press('Home');
  await expect(plot).toHaveAttribute('aria-valuetext', /^0\.0\d+ rad\/s, 4\d.* dB, −9\d/);
  const table = panel(page).getByRole('table', { name: 'Margins at the cuts' });
  await expect(table).toContainText('51.8° at 0.786 rad/s');
  await expect(table).toContainText('1.15 s');
  await table.getByRole('button', { name: 'Take out cut 1' }).click();
  await expect(table).toHaveCount(0);
});

test('the button cuts the selected wire', async ({ page }) => {
  await openLoop(page);
  await page.getByRole('tab', { name: 'Frequency' }).click();
  const button = panel(page).getByRole('button', { name: 'Cut the selected wire' });
  await blocks(page).nth(2).click();
  await expect(button).toBeDisabled();
  await page.keyboard.press('n');
  await button.click();
  await expect(page.getByRole('table', { name: 'Margins at the cuts' })).toContainText('51.8°');
});
