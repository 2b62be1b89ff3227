/** The list of drawings: pictures, names, the bin, versions, worked drawings, and two tabs on one drawing. */

import { readFileSync } from 'node:fs';
import { expect, type Page, test } from 'playwright/test';
import { block, blocks, openEmptySheet, openWorkedDrawing, writeBlocks } from './sheet-page.ts';

async function openList(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Drawings', exact: true }).click();
  await expect(page.getByRole('dialog', { name: 'Drawings' })).toBeVisible();
}

const kept = (page: Page) => page.getByRole('table', { name: 'Drawings kept on this device' });

async function pageWithTwoDrawings(page: Page): Promise<void> {
  await openEmptySheet(page);
  await page.getByLabel('Title of the drawing').fill('Ballast pump');
  await page.keyboard.press('Enter');
  await writeBlocks(page, 'u>', '1/s level', '>y');
  await page.waitForTimeout(700);
  await page.getByRole('button', { name: 'Empty sheet' }).click();
  await page.waitForTimeout(700);
}

test('a kept drawing has a picture and is found, renamed, duplicated, removed and brought back', async ({ page }) => {
  await pageWithTwoDrawings(page);
  await openList(page);
  const picture = kept(page).locator('img');
  await expect(picture.first()).toBeAttached();
  expect(
    await picture.first().evaluate((image: HTMLImageElement) => image.decode().then(() => image.naturalWidth)),
  ).toBeGreaterThan(0);
  await page.getByLabel('Search by title').fill('BALLAST');
  await expect(kept(page).getByRole('row')).toHaveCount(1);
  await page.getByLabel('Title of Ballast pump').fill('Trim pump');
  await page.keyboard.press('Enter');
  await expect(page.getByText('None with that in its title.')).toBeVisible();
  await page.getByLabel('Search by title').fill('');
  await page.getByRole('button', { name: 'Duplicate Trim pump' }).click();
  await page.getByRole('button', { name: 'Remove Trim pump', exact: true }).click();
  await expect(page.getByRole('button', { name: 'Open Trim pump', exact: true })).toHaveCount(0);
  await expect(page.getByRole('button', { name: 'Open Trim pump, copy' })).toBeVisible();
  await page.getByRole('button', { name: 'Bring back Trim pump' }).click();
  await page.getByRole('button', { name: 'Open Trim pump', exact: true }).click();
  await expect(block(page, 'integrator level')).toBeVisible();
  await expect(page.getByLabel('Title of the drawing')).toHaveValue('Trim pump');
});

test('a version is returned to by one undo step', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '1/s level');
  await page.getByRole('button', { name: 'Export…' }).click();
  await page.getByRole('button', { name: 'Close' }).click();
  await writeBlocks(page, '>y', '2');
  await openList(page);
  const versions = page.getByRole('table', { name: 'Versions of this drawing' });
  await versions.getByRole('row', { name: '2 blocks' }).getByRole('button').click();
  await expect(blocks(page)).toHaveCount(2);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(blocks(page)).toHaveCount(4);
});

test('each of six worked drawings opens and derives', async ({ page }) => {
  await openWorkedDrawing(page);
  for (const [title, states] of [
    ['Mixing tank', 6],
    ['Quarter car', 5],
    ['Step-down', 4],
    ['Fast steering', 8],
    ['Coaster', 4],
    ['Survey winch', 4],
  ] as const) {
    await openList(page);
    await page.getByRole('button', { name: new RegExp(`^${title}`) }).click();
    await expect(page.getByLabel('Title of the drawing')).toHaveValue(new RegExp(title));
    await expect(page.getByRole('contentinfo')).toContainText(`Stable, proved${states} states`);
  }
});

test('two tabs on one drawing keep both works, and the later one says so', async ({ page, context }) => {
  await openEmptySheet(page);
  await page.getByLabel('Title of the drawing').fill('Ballast pump');
  await page.keyboard.press('Enter');
  await writeBlocks(page, 'u>');
  await page.waitForTimeout(800);
  const other = await context.newPage();
  await other.goto('./');
  await expect(blocks(other)).toHaveCount(1);
  await other.waitForTimeout(800);
  await writeBlocks(page, '1/s mine');
  await page.waitForTimeout(800);
  await writeBlocks(other, '1/s theirs');
  await expect(other.getByText(/Another tab has changed this drawing/)).toBeVisible();
  await expect(other.getByLabel('Title of the drawing')).toHaveValue('Ballast pump (from another tab)');
  await other.waitForTimeout(800);
  await openList(other);
  await other.getByRole('button', { name: 'Open Ballast pump', exact: true }).click();
  await expect(block(other, 'integrator mine')).toBeVisible();
  await expect(block(other, 'integrator theirs')).toHaveCount(0);
  await openList(other);
  await other.getByRole('button', { name: 'Open Ballast pump (from another tab)' }).click();
  await expect(block(other, 'integrator theirs')).toBeVisible();
});

test('what is removed for good is gone from the list and the bin', async ({ page }) => {
  await pageWithTwoDrawings(page);
  await openList(page);
  await page.getByRole('button', { name: 'Remove Ballast pump', exact: true }).click();
  await page.getByRole('button', { name: 'Remove for good: Ballast pump' }).click();
  await expect(page.getByText('Removed, kept for 30 days')).toHaveCount(0);
  await expect(page.getByRole('button', { name: 'Open Ballast pump' })).toHaveCount(0);
});

test('a full device is said and the drawing stays on the sheet', async ({ page }) => {
  await openEmptySheet(page);
  await page.waitForTimeout(700);
  await page.evaluate(() => {
    IDBObjectStore.prototype.put = () => {
      throw new DOMException('full', 'QuotaExceededError');
    };
  });
  await writeBlocks(page, 'u>', '1/s level');
  await expect(page.getByText(/not kept: The device has no room left for drawings/)).toBeVisible();
  await page.getByRole('button', { name: 'Export…' }).click();
  await expect(page.getByText(/No version was kept/)).toBeAttached();
  await page.getByRole('button', { name: 'Close' }).click();
  await expect(blocks(page)).toHaveCount(2);
  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Save to a file' }).click();
  const file = await (await download).path();
  const saved = JSON.parse(readFileSync(file, 'utf8'));
  expect(saved.blocks).toHaveLength(2);
});
