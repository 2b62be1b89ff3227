/** What is reached and shown: the tab Structure, hidden modes in the pole table and on the drawing, the minimal model handed over. */

import { readFile } from 'node:fs/promises';
import { expect, test } from 'playwright/test';
import { openEmptySheet, openWorkedDrawing, writeBlocks } from './sheet-page.ts';

test('a cancelled pole is found, marked and left out of the minimal model, which is saved', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '(s+1)/((s+1)*(s+2))', '>y');
  await expect(page.locator('.pole-table-hidden')).toHaveText('hidden');
  await page.getByRole('tab', { name: 'Structure' }).click();
  const panel = page.getByRole('tabpanel', { name: 'Structure' });
  await expect(panel).toContainText('1 state would do for the same transfer functions.');
  await expect(panel.getByRole('table', { name: 'Hidden modes' })).toContainText('no output shows it');
  await expect(page.locator('.trace-hidden')).toHaveText('hidden mode');
  await panel.getByRole('button', { name: 'Show the minimal model' }).press('Enter');
  await expect(panel.getByLabel('Change of state')).toContainText('=');
  const saved = page.waitForEvent('download');
  await panel.getByRole('button', { name: 'Save the minimal model' }).click();
  const file = JSON.parse(await readFile(await (await saved).path(), 'utf8'));
  expect(file).toMatchObject({ states: ['z_1'], A: [[-2]], minimal: { change: [['1', '1']] } });
  await page.getByRole('tab', { name: 'Time' }).click();
  await expect(page.locator('.trace-hidden')).toHaveCount(0);
});

test('the export dialog saves the minimal model where that is ticked', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '(s+1)/((s+1)*(s+2))', '>y');
  await expect(page.locator('.pole-table-hidden')).toHaveText('hidden');
  await page.getByRole('button', { name: 'Export…' }).click();
  await page.getByRole('checkbox', { name: 'of the minimal model' }).check();
  const saved = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Save Model file' }).click();
  expect(JSON.parse(await readFile(await (await saved).path(), 'utf8'))).toMatchObject({ A: [[-2]], observable: true });
});

test('a minimal model is said to be one, and each channel names its states', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('tab', { name: 'Structure' }).click();
  const panel = page.getByRole('tabpanel', { name: 'Structure' });
  await expect(panel).toContainText('The model is minimal: no fewer than 4 states will do.');
  await expect(panel.getByRole('table', { name: 'What each state contributes' })).toContainText('a state of it');
  await page.getByRole('tab', { name: 'Transfer' }).click();
  await expect(page.getByText('states that take part: ω, F, q, T').first()).toBeVisible();
});
