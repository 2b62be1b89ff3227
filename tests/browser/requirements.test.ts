/**
 * Requirements kept in the drawing: written, judged while the drawing changes, judged over tolerances. The drawing is the standard
 * second-order loop with ω₀ = 1 and ζ = ½, whose overshoot is exp(−π ζ / √(1 − ζ²)) = 16.30 %.
 */

import { expect, type Page, test } from 'playwright/test';
import { blocks, drawWire, openEmptySheet, writeBlocks } from './sheet-page.ts';

async function openLoop(page: Page): Promise<void> {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '+-', '1/(s^2+d*s)', '>y');
  await drawWire(blocks(page).nth(2), 0, blocks(page).nth(1), 1);
  await page.getByRole('tab', { name: 'Requirements' }).click();
}

const panel = (page: Page) => page.getByRole('tabpanel', { name: 'Requirements' });
const list = (page: Page) => panel(page).getByRole('table', { name: 'Requirements' });
const verdict = (page: Page) => page.locator('footer');

async function require(page: Page, kind: string, bound: string, value: string): Promise<void> {
  await panel(page).getByRole('button', { name: 'Add a requirement' }).click();
  await panel(page).getByLabel('What').selectOption({ label: kind });
  await panel(page).getByLabel(bound).fill(value);
  await panel(page).getByRole('button', { name: 'Keep' }).click();
}

test('a requirement is written, judged, changed and removed, each an undo step', async ({ page }) => {
  await openLoop(page);
  await require(page, 'overshoot', 'at most, %', '20');
  const row = list(page).getByRole('row', { name: /overshoot from r to y at most 20 %/ });
  await expect(row).toContainText('16.3');
  await expect(row).toContainText('met, inside by 3.697');
  await expect(verdict(page)).toContainText('the requirement is met');
  await row.getByRole('button', { name: /^Change/ }).click();
  await panel(page).getByLabel('at most, %').fill('15');
  await panel(page).getByLabel('at most, %').press('Enter');
  await expect(list(page)).toContainText('missed, outside by 1.303');
  await expect(verdict(page)).toContainText('1 of 1 requirement not met');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(list(page)).toContainText('met, inside by 3.697');
  await list(page)
    .getByRole('button', { name: /^Remove/ })
    .click();
  await expect(panel(page)).toContainText('Nothing is required yet.');
});

test('it is judged again when a parameter changes, and the verdict leads to the list', async ({ page }) => {
  await openLoop(page);
  await require(page, 'damping ratio of every pole', 'at least', '0.4');
  await expect(verdict(page)).toContainText('the requirement is met');
  await page.getByRole('tab', { name: 'Time' }).click();
  const value = page.getByLabel('Value of d');
  await value.fill('0.6');
  await value.press('Enter');
  await verdict(page).getByRole('button', { name: '1 of 1 requirement not met' }).click();
  await expect(list(page)).toContainText('0.3');
  await expect(list(page)).toContainText('missed, outside by 0.1');
});

test('what is not filled in or does not exist is said', async ({ page }) => {
  await openLoop(page);
  await panel(page).getByRole('button', { name: 'Add a requirement' }).click();
  await panel(page).getByRole('button', { name: 'Keep' }).click();
  await expect(panel(page).getByRole('alert').first()).toHaveText('Give the bound.');
  await panel(page).getByLabel('What').selectOption('phase-margin');
  await panel(page).getByLabel('at least, degrees').fill('45');
  await panel(page).getByRole('button', { name: 'Keep' }).click();
  await expect(panel(page).getByRole('alert').first()).toHaveText(
    'Put a cut on a wire first: the requirement is about the loop there.',
  );
  await page.keyboard.press('Escape');
  await expect(panel(page).getByRole('button', { name: 'Add a requirement' })).toBeFocused();
});

test('by key alone: a requirement, tolerances, the judgement and its worst case', async ({ page }) => {
  await openLoop(page);
  await expect(panel(page).getByRole('button', { name: 'Add a requirement' })).toBeVisible();
  await page.getByRole('tab', { name: 'Requirements' }).focus();
  await page.keyboard.press('Tab');
  await page.keyboard.press('Enter');
  await expect(panel(page).getByLabel('What')).toBeFocused();
  await page.keyboard.type('damping');
  await page.keyboard.press('Tab');
  await page.keyboard.type('0.45');
  await page.keyboard.press('Enter');
  await expect(list(page)).toContainText('met, inside by 0.05');
  const tolerance = panel(page).getByRole('textbox', { name: 'Tolerance of d' });
  await tolerance.focus();
  await page.keyboard.type('20 %');
  await page.keyboard.press('Enter');
  const judge = panel(page).getByRole('button', { name: 'Judge at 203 points' });
  await judge.focus();
  await page.keyboard.press('Enter');
  const worst = panel(page).getByRole('table', { name: 'Worst cases' });
  // ζ = d / 2 is least at d = 0.8
  await expect(worst).toContainText('0.4');
  await expect(worst).toContainText('d = 0.8');
  await worst.getByRole('button', { name: /^Set the drawing/ }).focus();
  await page.keyboard.press('Enter');
  await expect(list(page)).toContainText('missed, outside by 0.05');
  await expect(panel(page)).toContainText('Of the drawing before its last change: judge again.');
  await page.keyboard.press('Control+z');
  await expect(list(page)).toContainText('met, inside by 0.05');
});

test('the band over the tolerances stands in the step response', async ({ page }) => {
  await openLoop(page);
  await panel(page).getByRole('textbox', { name: 'Tolerance of d' }).fill('20 %');
  await panel(page).getByRole('textbox', { name: 'Tolerance of d' }).press('Enter');
  await panel(page)
    .getByRole('button', { name: /^Judge at/ })
    .click();
  await expect(panel(page)).toContainText('203 points, every corner among them.');
  await page.getByRole('tab', { name: 'Time' }).click();
  await expect(page.getByRole('tabpanel', { name: 'Time' })).toContainText('the band: over the tolerances');
});

test('a long judgement is stopped', async ({ page }) => {
  await openLoop(page);
  await require(page, 'overshoot', 'at most, %', '20');
  await panel(page).getByRole('textbox', { name: 'Tolerance of d' }).fill('20 %');
  await panel(page).getByRole('textbox', { name: 'Tolerance of d' }).press('Enter');
  await panel(page).getByLabel('Random points').fill('100000');
  await panel(page).getByRole('button', { name: 'Judge at 100003 points' }).click();
  await expect(panel(page).getByRole('progressbar', { name: 'Points judged' })).toBeVisible();
  await panel(page).getByRole('button', { name: 'Stop' }).click();
  await expect(panel(page)).toContainText('Stopped before the end.');
});
