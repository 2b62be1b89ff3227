/** axe-core on every screen and dialog, in both themes and in a narrow window. */

import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type AxeCore from 'axe-core';
import { expect, type Page, test } from 'playwright/test';
import { block, matrixCell, openEmptySheet, openWorkedDrawing, writeBlocks } from './sheet-page.ts';

const AXE = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

declare global {
  interface Window {
    axe: typeof AxeCore;
  }
}

/** Serious and critical findings as `rule: element`. */
async function findings(page: Page): Promise<string[]> {
  await page.evaluate(AXE);
  return page.evaluate(async () => {
    const { violations } = await window.axe.run(document, { resultTypes: ['violations'] });
    return violations
      .filter(({ impact }) => impact === 'serious' || impact === 'critical')
      .flatMap(({ id, nodes }) => nodes.map(node => `${id}: ${node.html.slice(0, 120)}`));
  });
}

for (const colorScheme of ['light', 'dark'] as const) {
  for (const [width, height] of [
    [1440, 900],
    [480, 900],
  ] as const) {
    test(`the worked drawing, ${colorScheme}, ${width} wide`, async ({ page }) => {
      await page.emulateMedia({ colorScheme });
      await page.setViewportSize({ width, height });
      await openWorkedDrawing(page);
      await expect(page.getByText('every digit proved')).toBeVisible();
      expect(await findings(page)).toEqual([]);
    });
  }
}

for (const [button, dialog] of [
  ['Export…', 'Export'],
  ['Drawings', 'Drawings'],
] as const) {
  test(`the dialog ${dialog}`, async ({ page }) => {
    await openWorkedDrawing(page);
    await page.getByRole('button', { name: button }).click();
    await expect(page.getByRole('dialog', { name: dialog })).toBeVisible();
    expect(await findings(page)).toEqual([]);
  });
}

test('a sheet with a refused model', async ({ page }) => {
  await openWorkedDrawing(page);
  await page.getByRole('button', { name: 'Remove parameter J' }).click();
  await expect(page.getByRole('list', { name: 'Problems' })).toBeVisible();
  expect(await findings(page)).toEqual([]);
});

for (const colorScheme of ['light', 'dark'] as const) {
  test(`texts and frames, one of them being written, and what is selected to be exported, ${colorScheme}`, async ({
    page,
  }) => {
    await page.emulateMedia({ colorScheme });
    await openWorkedDrawing(page);
    await writeBlocks(page, '"a text"');
    await block(page, 'gain K_p').click();
    await page.keyboard.press('b');
    await expect(page.getByLabel('Title of the frame')).toBeFocused();
    expect(await findings(page)).toEqual([]);
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: 'Export…' }).click();
    await expect(page.getByRole('radio', { name: 'what is selected' })).toBeVisible();
    expect(await findings(page)).toEqual([]);
  });
}

for (const colorScheme of ['light', 'dark'] as const) {
  test(`a kept trace, and the structure with a hidden mode and the minimal model, ${colorScheme}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme });
    await openWorkedDrawing(page);
    await matrixCell(page, 1, 4).click();
    await expect(page.getByRole('button', { name: 'let go' })).toBeVisible();
    expect(await findings(page)).toEqual([]);
    await openEmptySheet(page);
    await writeBlocks(page, 'r>', '(s+1)/((s+1)*(s+2))', '>y');
    await page.getByRole('tab', { name: 'Structure' }).click();
    await page.getByRole('button', { name: 'Show the minimal model' }).click();
    await expect(page.getByLabel('Change of state')).toBeVisible();
    expect(await findings(page)).toEqual([]);
  });
  test(`the workings, ${colorScheme}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme });
    await openWorkedDrawing(page);
    await page.getByRole('tab', { name: 'Workings' }).click();
    await expect(page.getByRole('heading', { name: 'Result', exact: true })).toBeVisible();
    expect(await findings(page)).toEqual([]);
  });
}
