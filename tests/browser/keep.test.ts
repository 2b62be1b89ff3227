/** Drawings are kept while they change: reopened where one left off, and a killed tab loses at most the last second. */

import { expect, test } from 'playwright/test';
import { block, blocks, openEmptySheet, writeBlocks } from './sheet-page.ts';

test('a reloaded page shows what was on the sheet', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '2', '1/s level', '>y');
  await page.waitForTimeout(1000);
  await page.reload();
  await expect(blocks(page)).toHaveCount(4);
  await expect(block(page, 'integrator level')).toBeVisible();
});

test('a tab killed in mid-edit has kept everything older than a second', async ({ page, context }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '2', '1/s level');
  await page.waitForTimeout(1000);
  await writeBlocks(page, '>y');
  const killer = await context.newCDPSession(page);
  // Never answered: the connection breaks with the tab.
  killer.send('Page.crash').catch(() => undefined);
  await page.waitForEvent('crash');
  const again = await context.newPage();
  await again.goto('./');
  await expect(block(again, 'integrator level')).toBeVisible();
  expect(await blocks(again).count()).toBeGreaterThanOrEqual(3);
});

test('the drawing left for another is in the list and comes back', async ({ page }) => {
  await openEmptySheet(page);
  await page.getByLabel('Title of the drawing').fill('Ballast pump');
  await page.keyboard.press('Enter');
  await writeBlocks(page, '1/s level');
  await page.getByRole('button', { name: 'Empty sheet' }).click();
  await page.getByRole('button', { name: 'Drawings' }).click();
  await page.getByRole('button', { name: 'Open Ballast pump' }).click();
  await expect(block(page, 'integrator level')).toBeVisible();
  await expect(page.getByLabel('Title of the drawing')).toHaveValue('Ballast pump');
});

test('where the browser refuses to keep drawings the page says so and goes on', async ({ page }) => {
  await page.addInitScript(() => {
    Object.defineProperty(window, 'indexedDB', {
      get: () => {
        throw new DOMException('refused', 'SecurityError');
      },
    });
  });
  await page.goto('./');
  await expect(block(page, 'gain K_p')).toBeVisible();
  await expect(page.getByText(/not kept: This browser does not let the page keep drawings/)).toBeVisible();
});
