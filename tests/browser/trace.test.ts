/** Why an entry is what it is: by mouse and by keyboard, from the matrix to the drawing and back. */

import { expect, type Page, test } from 'playwright/test';
import {
  block,
  drawWire,
  expectMatrix,
  matrixCell,
  openEmptySheet,
  openWorkedDrawing,
  writeBlocks,
} from './sheet-page.ts';

const sentence = (page: Page) => page.locator('.trace-sentence');
const grid = (page: Page) => page.getByRole('grid');

/** A point of the window halfway along a wire. */
function middleOfWire(page: Page, key: string): Promise<{ x: number; y: number }> {
  return page.locator(`.react-flow__edge[data-id="${key}"] path.wire-reach`).evaluate(path => {
    if (!(path instanceof SVGPathElement)) throw new Error('no wire');
    const { x, y } = path.getPointAtLength(path.getTotalLength() / 2);
    const { a, d, e, f } = path.getScreenCTM() ?? new DOMMatrix();
    return { x: a * x + e, y: d * y + f };
  });
}

test('pointing at an entry lights its path and says its value; a click keeps it, Escape lets go', async ({ page }) => {
  await openWorkedDrawing(page);
  const panel = page.getByRole('region', { name: 'System matrix' });
  const before = await panel.boundingBox();
  await matrixCell(page, 1, 4).hover();
  await expect(sentence(page)).toContainText('1/J = 5/4');
  await expect(sentence(page)).toContainText('one path: T → summing point → 1/J → integrator ω');
  await expect(page.locator('.trace-wire-path')).toHaveCount(3);
  await expect(page.locator('.trace-block-end')).toHaveCount(2);
  expect(await panel.boundingBox()).toEqual(before);
  await page.mouse.move(5, 5);
  await expect(sentence(page)).toHaveCount(0);
  await expect(page.locator('.trace-wire')).toHaveCount(0);
  await matrixCell(page, 1, 4).click();
  await page.mouse.move(5, 5);
  await expect(sentence(page)).toContainText('1/J = 5/4');
  await page.keyboard.press('Escape');
  await expect(sentence(page)).toHaveCount(0);
});

test('a kept entry lists each path and loop without moving what stands below', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '+-', '3', '1/s', '>y');
  await drawWire(block(page, 'gain 3'), 0, block(page, 'summing point sum'), 1);
  await expectMatrix(page, [
    ['0', '3/4'],
    ['1', '0'],
  ]);
  const tabs = page.getByRole('tablist');
  const before = await tabs.boundingBox();
  await matrixCell(page, 1, 2).hover();
  await expect(sentence(page)).toContainText(
    'one path over the determinant of one loop (click or Enter: each of them)',
  );
  await matrixCell(page, 1, 2).click();
  await expect(page.locator('.trace-determinant')).toHaveText(/^determinant 4; loop gains −3 \(/);
  await expect(page.locator('.trace-wire-loop')).toHaveCount(1);
  expect(await tabs.boundingBox()).toEqual(before);
});

test('the arrow keys walk the entries, Enter keeps one, and each is said', async ({ page }) => {
  await openWorkedDrawing(page);
  await grid(page).focus();
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('ArrowRight');
  const said = page.locator('.trace-line').getByRole('status');
  await expect(said).toHaveText(
    'the derivative of omega from F: -R/J = −5/16, one path: F, then R, then summing point, then 1/J, then integrator omega.',
  );
  await page.keyboard.press('Enter');
  await page.keyboard.press('Tab');
  await expect(said).toContainText('-R/J');
  await page.getByRole('button', { name: 'let go' }).click();
  await expect(said).toBeEmpty();
});

test('pointing at a block or a wire marks the entries it takes part in', async ({ page }) => {
  await openWorkedDrawing(page);
  await block(page, 'gain 1/J').hover();
  await expect(sentence(page)).toContainText('Gain 1/J takes part in 3 entries');
  await expect(page.locator('.trace-line').getByRole('status')).toHaveText(
    'Gain 1/J takes part in 3 entries: the derivative of omega from omega, the derivative of omega from F, the derivative of omega from T.',
  );
  await expect(page.locator('.system-matrix-lit')).toHaveCount(3);
  await expect(page.getByRole('tooltip')).toContainText('3 of the system matrix');
  await page.mouse.move(700, 5);
  await expect(page.locator('.system-matrix-lit')).toHaveCount(0);
  const along = await middleOfWire(page, 'torque:1');
  await page.mouse.move(along.x, along.y);
  await expect(sentence(page)).toContainText('The wire from gain R to summing point torque takes part in 1 entry');
  await expect(page.getByRole('tooltip')).toContainText('gain R → summing point torque');
  await page.mouse.move(700, 5);
  await block(page, 'integrator q').focus();
  await page.keyboard.press('Tab');
  await page.keyboard.press('Shift+Tab');
  await expect(sentence(page)).toContainText('Integrator q takes part in 3 entries');
});

test('a wire chosen by key marks the entries it takes part in', async ({ page }) => {
  await openWorkedDrawing(page);
  await block(page, 'gain K_i').click();
  await page.mouse.move(700, 5);
  await page.keyboard.press('n');
  await expect(sentence(page)).toContainText('The wire from integrator q to gain K_i takes part in 1 entry: ');
  await expect(page.locator('.system-matrix-lit')).toHaveText('8');
  await page.keyboard.press('Escape');
  await expect(page.locator('.system-matrix-lit')).toHaveCount(0);
});

test('by touch an entry is kept by a tap and let go by another', async ({ browser, baseURL }) => {
  const context = await browser.newContext({ hasTouch: true, baseURL: baseURL ?? '' });
  const page = await context.newPage();
  await openWorkedDrawing(page);
  await matrixCell(page, 1, 4).tap();
  await expect(page.locator('.trace-wire-path')).toHaveCount(3);
  await matrixCell(page, 1, 4).tap();
  await expect(page.locator('.trace-wire-path')).toHaveCount(0);
  await context.close();
});
