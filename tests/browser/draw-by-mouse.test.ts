/** From an empty sheet to the matrices with the mouse. The expected matrices are hand calculations beside each drawing. */

import { expect, test } from 'playwright/test';
import {
  block,
  blocks,
  dragBy,
  drawWire,
  expectMatrix,
  middle,
  openEmptySheet,
  verdict,
  writeBlocks,
} from './sheet-page.ts';

test('a first-order loop is drawn from dragged parts and its matrices follow each wire', async ({ page }) => {
  await openEmptySheet(page);
  const sheet = page.locator('.react-flow__pane');
  const places: [string, number, number][] = [
    ['Place input', 80, 200],
    ['Place summing point', 220, 200],
    ['Place gain', 360, 200],
    ['Place integrator', 500, 200],
    ['Place output', 640, 200],
  ];
  for (const [part, x, y] of places) {
    await page.getByRole('button', { name: part, exact: true }).dragTo(sheet, { targetPosition: { x, y } });
    await page.keyboard.press('Escape');
  }
  await expect(blocks(page)).toHaveCount(5);

  await drawWire(block(page, 'input u'), 0, block(page, 'summing point sum'), 0);
  await drawWire(block(page, 'summing point sum'), 0, block(page, 'gain 1'), 0);
  await drawWire(block(page, 'gain 1'), 0, block(page, 'integrator x'), 0);
  await drawWire(block(page, 'integrator x'), 0, block(page, 'output y'), 0);
  // x' = u, y = x
  await expectMatrix(page, [
    ['0', '1'],
    ['1', '0'],
  ]);

  await drawWire(block(page, 'integrator x'), 0, block(page, 'summing point sum'), 1);
  await block(page, 'gain 1').dblclick();
  await page.getByLabel('gain', { exact: true }).fill('5/2');
  await page.keyboard.press('Enter');
  // x' = 5/2 (u − x), y = x
  await expectMatrix(page, [
    ['−5/2', '5/2'],
    ['1', '0'],
  ]);
  await expect(verdict(page)).toContainText('Stable, proved');
});

test('a loop around two gains is solved: x dot = 2/(1 + 2·3) (u − x)', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '+--', '2', '1/s x', '>y');
  await writeBlocks(page, '3');
  await page.keyboard.press('Escape');
  // The amplifier's output goes back through 3 to the summing point: an algebraic loop of gain −6.
  await drawWire(block(page, 'gain 2'), 0, block(page, 'gain 3'), 0);
  await drawWire(block(page, 'gain 3'), 0, block(page, 'summing point sum'), 1);
  await drawWire(block(page, 'integrator x'), 0, block(page, 'summing point sum'), 2);
  await expectMatrix(page, [
    ['−2/7', '2/7'],
    ['1', '0'],
  ]);
  await expect(verdict(page)).toContainText('1 algebraic loop');
});

test('a drag is one undo step, and undo and redo go through every edit', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '4', '1/s x');
  const gain = block(page, 'gain 4');
  const before = await middle(gain);
  await dragBy(gain, 0, 120);
  const after = await middle(gain);
  expect(after.y - before.y).toBeGreaterThan(80);
  await page.getByRole('button', { name: 'Undo' }).click();
  expect(await middle(gain)).toEqual(before);
  await page.getByRole('button', { name: 'Redo' }).click();
  expect(await middle(gain)).toEqual(after);
  for (let step = 0; step < 4; step++) await page.keyboard.press('Control+z');
  await expect(blocks(page)).toHaveCount(0);
  await expect(page.getByRole('button', { name: 'Undo' })).toBeDisabled();
  for (let step = 0; step < 4; step++) await page.keyboard.press('Control+y');
  await expect(blocks(page)).toHaveCount(3);
});

test('a block is mirrored, renamed and removed with its wires', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '1/s x', '>y');
  await block(page, 'integrator x').dblclick();
  await page.getByLabel('state', { exact: true }).fill('omega');
  await page.keyboard.press('Enter');
  await expect(block(page, 'integrator omega')).toBeVisible();
  await page.keyboard.press('m');
  const port = await middle(block(page, 'integrator omega').locator('[data-handleid="out:0"]'));
  expect(port.x).toBeLessThan((await middle(block(page, 'integrator omega'))).x);
  await block(page, 'integrator omega').click();
  await page.keyboard.press('Delete');
  await expect(blocks(page)).toHaveCount(2);
  await expect(page.locator('.react-flow__edge')).toHaveCount(0);
});

test('a wire is removed and its open port is marked where it is', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '3', '1/s x', '>y');
  await expectMatrix(page, [
    ['0', '3'],
    ['1', '0'],
  ]);
  const from = await middle(block(page, 'gain 3').locator('[data-handleid="out:0"]'));
  const to = await middle(block(page, 'integrator x').locator('[data-handleid="in:0"]'));
  await page.mouse.click((from.x + to.x) / 2, from.y);
  await page.keyboard.press('Delete');
  await expect(block(page, 'integrator x').locator('.open-port')).toHaveCount(1);
  await expectMatrix(page, [
    ['0', '0'],
    ['1', '0'],
  ]);
  await expect(page.getByRole('region', { name: 'Warning' })).toContainText('reads zero');
});

test('a loop without a solution names its blocks, marks them, and the rest can be worked on', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '++', '1', '>y');
  await drawWire(block(page, 'gain 1'), 0, block(page, 'summing point sum'), 1);
  const problems = page.getByRole('list', { name: 'Problems' });
  await expect(problems).toContainText('algebraic loop');
  await expect(problems).toContainText('summing point sum');
  await expect(problems).toContainText('gain');
  await expect(block(page, 'gain 1').locator('.block-wrong')).toHaveCount(1);
  await expect(block(page, 'input u').locator('.block-wrong')).toHaveCount(0);
  await block(page, 'gain 1').dblclick();
  await page.getByLabel('gain', { exact: true }).fill('1/2');
  await page.keyboard.press('Enter');
  // y = (u + y)/2, so y = u
  await expectMatrix(page, [['1']]);
  await expect(verdict(page)).toContainText('1 algebraic loop, solved');
});
