/** The Time tab: any input signal, dead times and limiters as they are, comparison, read-out, files. */

import { readFile } from 'node:fs/promises';
import { expect, type Page, test } from 'playwright/test';
import { blocks, drawWire, openEmptySheet, writeBlocks } from './sheet-page.ts';

const panel = (page: Page) => page.getByRole('tabpanel', { name: 'Time' });
const plot = (page: Page) => panel(page).getByRole('slider').first();

/** x′ = sat(4 (r − x)) between ±1: top speed for 0.75 s, then e^(−4 t) (by hand). */
async function openPositioner(page: Page): Promise<void> {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '+-', '4', '-1 .. 1', '1/s x', '>y');
  await drawWire(blocks(page).nth(4), 0, blocks(page).nth(1), 1);
}

test('a limiter acts, the linear answer stands beside it, and both are said', async ({ page }) => {
  await openPositioner(page);
  await expect(panel(page)).toContainText('Dashed: the linear model: limiters as unity.');
  await expect(panel(page)).toContainText('at its upper limit from 0 s to 0.750 s');
  await panel(page).getByLabel('until / s').fill('2');
  await expect(plot(page)).toHaveAttribute('aria-valuemax', '2');
  await plot(page).focus();
  await page.keyboard.press('Home');
  for (let k = 0; k < 25; k++) await page.keyboard.press('ArrowRight');
  await expect(plot(page)).toHaveAttribute(
    'aria-valuetext',
    /^t = 0\.500? s, limits acting = 0\.5000, linear model = 0\.8647/,
  );
});

test('a dead time is true: nothing comes before it has passed', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', 'e^(-2*s)', '1/(s+1)', '>y');
  await expect(panel(page)).toContainText('Dashed: the linear model: dead time approximated.');
  await panel(page).getByLabel('until / s').fill('10');
  await expect(plot(page)).toHaveAttribute('aria-valuemax', '10');
  await plot(page).focus();
  await page.keyboard.press('Home');
  await page.keyboard.press('PageUp');
  await expect(plot(page)).toHaveAttribute('aria-valuetext', /^t = 1 s, true dead time = 0\.000, /);
});

test('a sine, a pulse and a recorded signal drive the input', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '1/(s+1)', '>y');
  await panel(page).getByLabel('input', { exact: true }).selectOption('sine');
  await panel(page).getByLabel('ω / rad/s').fill('1');
  await expect(plot(page)).toHaveAttribute('aria-label', 'sine in r, response of y');
  await panel(page).getByLabel('ω / rad/s').fill('0');
  await expect(panel(page)).toContainText('Frequency: write a number above zero.');
  await panel(page).getByLabel('input', { exact: true }).selectOption('recorded');
  const text = 'time,force\r\n0,0\r\n1,2\r\n4,2\r\n';
  await panel(page)
    .getByLabel('Recorded signal', { exact: true })
    .setInputFiles({ name: 'force.csv', mimeType: 'text/csv', buffer: Buffer.from(text) });
  await expect(plot(page)).toHaveAttribute('aria-label', 'recorded signal in r, response of y');
  await panel(page).getByLabel('until / s').fill('4');
  await expect(plot(page)).toHaveAttribute('aria-valuemax', '4');
  await plot(page).focus();
  await page.keyboard.press('End');
  // A ramp of slope 2 over a second, then held: 2 (1 − e^(−4) (e − 1)) = 1.93706 at 4 s
  await expect(plot(page)).toHaveAttribute('aria-valuetext', /= 1\.937$/);
});

test('a response is kept and compared, and saved as a table', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'T = 1', 'r>', '1/(T*s+1)', '>y');
  await panel(page).getByRole('button', { name: 'Keep for comparison' }).click();
  await page.getByLabel('Value of T', { exact: true }).fill('2');
  await page.getByLabel('Value of T', { exact: true }).press('Enter');
  await plot(page).focus();
  await expect(plot(page)).toHaveAttribute('aria-valuetext', /linear = .*, kept 1 = /);
  const download = page.waitForEvent('download');
  await panel(page).getByRole('button', { name: 'Save as CSV' }).click();
  const rows = (await readFile(await (await download).path(), 'utf8')).split('\r\n');
  expect(rows[0]).toBe('t,y linear,y kept 1');
  expect(rows).toHaveLength(803);
});

test('the time axis is dragged and moved by key', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '1/(s+1)', '>y');
  const grip = panel(page).getByRole('slider', { name: 'Shown until' });
  await grip.focus();
  await page.keyboard.press('ArrowRight');
  const longer = Number(await panel(page).getByLabel('until / s').inputValue());
  expect(longer).toBeGreaterThan(5);
  const box = await grip.boundingBox();
  if (box === null) throw new Error('no grip');
  await page.mouse.move(box.x + box.width / 2, box.y + 10);
  await page.mouse.down();
  await page.mouse.move(box.x + box.width / 4, box.y + 10, { steps: 4 });
  await page.mouse.up();
  const after = Number(await panel(page).getByLabel('until / s').inputValue());
  expect(after).toBeGreaterThan(1.7 * longer);
});
