/** Changing a drawing on the sheet: into wires, along wires, by selection, by clipboard. Matrices are hand calculations. */

import { expect, type Locator, type Page, test } from 'playwright/test';
import {
  block,
  blocks,
  dragBy,
  drawWire,
  expectMatrix,
  matrix,
  middle,
  openEmptySheet,
  openWorkedDrawing,
  writeBlocks,
} from './sheet-page.ts';

const sheet = (page: Page): Locator => page.locator('.sheet');
const wires = (page: Page): Locator => page.locator('.react-flow__edge');
const notice = (page: Page): Locator => page.locator('.notice');

/** A chain u → 2 → x → y: x' = 2u, y = x. */
async function drawChain(page: Page): Promise<void> {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '2', '1/s x', '>y');
  await sheet(page).focus();
  await page.keyboard.press('Escape');
  await expectMatrix(page, [
    ['0', '2'],
    ['1', '0'],
  ]);
}

/** Half way between an output and an input. */
async function between(from: Locator, to: Locator): Promise<{ x: number; y: number }> {
  const start = await middle(from.locator('[data-handleid="out:0"]'));
  const end = await middle(to.locator('[data-handleid="in:0"]'));
  return { x: (start.x + end.x) / 2, y: (start.y + end.y) / 2 };
}

async function dragFrom(page: Page, start: { x: number; y: number }, end: { x: number; y: number }): Promise<void> {
  await page.mouse.move(start.x, start.y);
  await page.mouse.down();
  await page.mouse.move(start.x + Math.sign(end.x - start.x), start.y + Math.sign(end.y - start.y));
  await page.mouse.move((start.x + end.x) / 2, (start.y + end.y) / 2, { steps: 6 });
  await page.mouse.move(end.x, end.y, { steps: 4 });
  await page.mouse.up();
}

/** Takes the last step back. */
async function undoOnce(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Undo' }).click();
}

test('a part let go on a wire goes into it, as one undo step', async ({ page }) => {
  await drawChain(page);
  const place = await between(block(page, 'gain 2'), block(page, 'integrator x'));
  const box = await page.locator('.react-flow__pane').boundingBox();
  await page.getByRole('button', { name: 'Place gain', exact: true }).dragTo(page.locator('.react-flow__pane'), {
    targetPosition: { x: place.x - (box?.x ?? 0), y: place.y - (box?.y ?? 0) },
    force: true,
  });
  await page.getByLabel('gain', { exact: true }).fill('5');
  await page.keyboard.press('Enter');
  // x' = 5·2 u
  await expectMatrix(page, [
    ['0', '10'],
    ['1', '0'],
  ]);
  await undoOnce(page);
  await undoOnce(page);
  await expect(blocks(page)).toHaveCount(4);
  await expectMatrix(page, [
    ['0', '2'],
    ['1', '0'],
  ]);
});

test('a part placed by key while a wire is selected goes into that wire', async ({ page }) => {
  await drawChain(page);
  const place = await between(block(page, 'integrator x'), block(page, 'output y'));
  await page.mouse.click(place.x, place.y);
  await page.keyboard.press('g');
  await page.getByLabel('gain', { exact: true }).fill('3');
  await page.keyboard.press('Enter');
  // y = 3x
  await expectMatrix(page, [
    ['0', '2'],
    ['3', '0'],
  ]);
});

test('a free block dragged onto a wire goes into it and Alt+drag pulls it out again', async ({ page }) => {
  await drawChain(page);
  await writeBlocks(page, '7');
  await sheet(page).focus();
  await page.keyboard.press('Escape');
  const wire = await between(block(page, 'gain 2'), block(page, 'integrator x'));
  await dragFrom(page, await middle(block(page, 'gain 7')), wire);
  // x' = 7·2 u
  await expectMatrix(page, [
    ['0', '14'],
    ['1', '0'],
  ]);
  await expect(notice(page)).toContainText('Put gain 7 into the wire from gain 2 to integrator x.');
  await page.keyboard.down('Alt');
  await dragBy(block(page, 'gain 7'), 0, 150);
  await page.keyboard.up('Alt');
  await expectMatrix(page, [
    ['0', '2'],
    ['1', '0'],
  ]);
  await expect(notice(page)).toContainText('Pulled gain 7 out of its wires.');
  await undoOnce(page);
  await expectMatrix(page, [
    ['0', '14'],
    ['1', '0'],
  ]);
});

test('H pulls a block out and Shift+Delete removes it, and the wire closes behind; Delete alone leaves it open', async ({
  page,
}) => {
  await drawChain(page);
  const healed = [
    ['0', '1'],
    ['1', '0'],
  ];
  await block(page, 'gain 2').click();
  await page.keyboard.press('h');
  await expectMatrix(page, healed);
  await expect(blocks(page)).toHaveCount(4);
  await undoOnce(page);
  await block(page, 'gain 2').click();
  await page.keyboard.press('Shift+Delete');
  await expectMatrix(page, healed);
  await expect(blocks(page)).toHaveCount(3);
  await undoOnce(page);
  await block(page, 'gain 2').click();
  await page.keyboard.press('Delete');
  await expectMatrix(page, [
    ['0', '0'],
    ['1', '0'],
  ]);
});

test('a branch starts anywhere on a wire, a click on it selects', async ({ page }) => {
  await drawChain(page);
  await writeBlocks(page, '>z');
  await sheet(page).focus();
  await page.keyboard.press('Escape');
  await dragBy(block(page, 'output z'), 0, 100);
  const start = await between(block(page, 'gain 2'), block(page, 'integrator x'));
  await page.mouse.click(start.x, start.y);
  await expect(page.locator('.react-flow__edge.selected')).toHaveCount(1);
  await page.keyboard.press('Escape');
  const end = await middle(block(page, 'output z').locator('[data-handleid="in:0"]'));
  await dragFrom(page, start, end);
  // z = 2u, from the same output as the wire that it branches off.
  await expectMatrix(page, [
    ['0', '2'],
    ['1', '0'],
    ['0', '2'],
  ]);
  await expect(page.locator('.branch-dots circle')).toHaveCount(1);
});

/** Drags with one finger. */
async function swipe(page: Page, start: { x: number; y: number }, end: { x: number; y: number }): Promise<void> {
  const device = await page.context().newCDPSession(page);
  const touch = (type: 'touchStart' | 'touchMove', x: number, y: number) =>
    device.send('Input.dispatchTouchEvent', { type, touchPoints: [{ x, y }] });
  await touch('touchStart', start.x, start.y);
  for (let step = 1; step <= 8; step++) {
    const along = step / 8;
    await touch('touchMove', start.x + along * (end.x - start.x), start.y + along * (end.y - start.y));
  }
  await device.send('Input.dispatchTouchEvent', { type: 'touchEnd', touchPoints: [] });
  await device.detach();
  // The browser takes a touch that follows at once for part of the same gesture.
  await page.waitForTimeout(500);
}

test('by touch, a branch is drawn, a wire is bent and its end is moved', async ({ browser }) => {
  const page = await browser.newPage({ hasTouch: true });
  await drawChain(page);
  await writeBlocks(page, '>z');
  await dragBy(block(page, 'output z'), 0, 100);
  const start = await between(block(page, 'gain 2'), block(page, 'integrator x'));
  const end = await middle(block(page, 'output z').locator('[data-handleid="in:0"]'));
  await swipe(page, start, end);
  await expectMatrix(page, [
    ['0', '2'],
    ['1', '0'],
    ['0', '2'],
  ]);
  await page.keyboard.press('Escape');
  const last = await between(block(page, 'integrator x'), block(page, 'output y'));
  await page.touchscreen.tap(last.x, last.y);
  await page.waitForTimeout(500);
  const path = page.locator('.react-flow__edge.selected .wire-reach');
  const straight = await path.getAttribute('d');
  const grip = await middle(page.locator('.bend-grip').first());
  await swipe(page, grip, { x: grip.x, y: grip.y - 60 });
  await expect(path).not.toHaveAttribute('d', straight ?? '');
  const ring = await middle(page.locator('.end-grip[data-end="source"]'));
  await swipe(page, ring, await middle(block(page, 'gain 2').locator('[data-handleid="out:0"]')));
  // y = 2u now; the integrator is left without a wire from it.
  await expectMatrix(page, [
    ['0', '2'],
    ['0', '2'],
    ['0', '2'],
  ]);
  await page.close();
});

test("a wire's arrowhead is dragged to another port, and its start by the ring it shows when selected", async ({
  page,
}) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '2', '>y');
  await sheet(page).focus();
  await page.keyboard.press('Escape');
  await writeBlocks(page, '>z');
  await sheet(page).focus();
  await page.keyboard.press('Escape');
  await dragBy(block(page, 'output z'), 0, 100);
  const head = await middle(block(page, 'output y').locator('[data-handleid="in:0"]'));
  const other = await middle(block(page, 'output z').locator('[data-handleid="in:0"]'));
  await dragFrom(page, { x: head.x - 11, y: head.y }, other);
  // y is open and reads zero, z = 2u.
  await expectMatrix(page, [['0'], ['2']]);
  await expect(wires(page)).toHaveCount(2);
  await dragFrom(
    page,
    await middle(page.locator('.end-grip[data-end="source"]')),
    await middle(block(page, 'input u').locator('[data-handleid="out:0"]')),
  );
  // z = u
  await expectMatrix(page, [['0'], ['1']]);
  await expect(wires(page)).toHaveCount(2);
});

test('a wire let go on empty paper asks for the block that it leads to', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '2');
  await sheet(page).focus();
  await page.keyboard.press('Escape');
  const start = await middle(block(page, 'gain 2').locator('[data-handleid="out:0"]'));
  await dragFrom(page, start, { x: start.x + 120, y: start.y + 130 });
  await expect(page.getByLabel('Write a block', { exact: true })).toBeFocused();
  await page.keyboard.type('>y');
  await page.keyboard.press('Enter');
  await expectMatrix(page, [['2']]);
  const placed = await middle(block(page, 'output y'));
  expect(Math.abs(placed.y - (start.y + 130))).toBeLessThan(20);
});

test('a summing point grows a port when a wire is brought to it, and its signs change by one key', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '++', '1/s x', '>y');
  await sheet(page).focus();
  await page.keyboard.press('Escape');
  await drawWire(block(page, 'integrator x'), 0, block(page, 'summing point sum'), 1);
  // Both ports are taken now; one more wire on the body brings a third: x' = u + x + x.
  const start = await middle(block(page, 'integrator x').locator('[data-handleid="out:0"]'));
  await dragFrom(page, start, await middle(block(page, 'summing point sum')));
  await expectMatrix(page, [
    ['2', '1'],
    ['1', '0'],
  ]);
  await block(page, 'summing point sum').click();
  await page.keyboard.press('s');
  // x' = u + x − x
  await expectMatrix(page, [
    ['0', '1'],
    ['1', '0'],
  ]);
  const first = await between(block(page, 'input u'), block(page, 'summing point sum'));
  await page.mouse.click(first.x, first.y);
  await page.keyboard.press('-');
  await expectMatrix(page, [
    ['0', '−1'],
    ['1', '0'],
  ]);
  await page.keyboard.press('+');
  await expectMatrix(page, [
    ['0', '1'],
    ['1', '0'],
  ]);
});

test('a selected wire is bent by its grip, stays bent while blocks move, and R takes the bends out', async ({
  page,
}) => {
  await drawChain(page);
  const path = page.locator('.react-flow__edge .wire-reach').nth(1);
  const straight = await path.getAttribute('d');
  const place = await between(block(page, 'gain 2'), block(page, 'integrator x'));
  await page.mouse.click(place.x, place.y);
  await dragBy(page.locator('.bend-grip').first(), 0, 60);
  const bent = await path.getAttribute('d');
  expect(bent).not.toBe(straight);
  await dragBy(block(page, 'output y'), 0, 80);
  expect(await path.getAttribute('d')).toBe(bent);
  await page.keyboard.press('Control+z');
  await page.keyboard.press('Control+z');
  expect(await path.getAttribute('d')).toBe(straight);
  await page.mouse.click(place.x, place.y);
  await page.keyboard.press('ArrowDown');
  expect(await path.getAttribute('d')).not.toBe(straight);
  await page.keyboard.press('r');
  expect(await path.getAttribute('d')).toBe(straight);
  await page.keyboard.press('ArrowDown');
  await page.locator('.wire-reach').nth(1).dispatchEvent('dblclick');
  expect(await path.getAttribute('d')).toBe(straight);
});

test('blocks are aligned and spread by key, one undo step each', async ({ page }) => {
  await drawChain(page);
  const chain = ['input u', 'gain 2', 'integrator x', 'output y'] as const;
  await dragBy(block(page, 'gain 2'), 20, 80);
  await dragBy(block(page, 'integrator x'), 0, 120);
  const heights = () => Promise.all(chain.map(async title => Math.round((await middle(block(page, title))).y)));
  const before = await heights();
  expect(new Set(before).size).toBe(3);
  await page.keyboard.press('Control+a');
  await page.keyboard.press('Alt+c');
  expect(new Set(await heights()).size).toBe(1);
  await expect(notice(page)).toContainText('Aligned 4 blocks in one row.');
  await page.keyboard.press('Alt+s');
  await expect(notice(page)).toContainText('Spread 4 blocks evenly from left to right.');
  const boxes = await Promise.all(chain.map(title => block(page, title).locator('.block').boundingBox()));
  const gaps = boxes.slice(1).map((box, k) => (box?.x ?? 0) - ((boxes[k]?.x ?? 0) + (boxes[k]?.width ?? 0)));
  for (const gap of gaps) expect(Math.abs(gap - (gaps[0] ?? 0))).toBeLessThan(1);
  await page.keyboard.press('Control+z');
  await page.keyboard.press('Control+z');
  expect(await heights()).toEqual(before);
});

test('a frame selects, Shift extends, Escape lets go', async ({ page }) => {
  await drawChain(page);
  const first = await middle(block(page, 'input u'));
  const second = await middle(block(page, 'gain 2'));
  await page.keyboard.down('Shift');
  await dragFrom(page, { x: first.x - 60, y: first.y - 60 }, { x: second.x + 40, y: second.y + 60 });
  await page.keyboard.up('Shift');
  await expect(page.locator('.block-selected')).toHaveCount(2);
  await block(page, 'output y').click({ modifiers: ['Shift'] });
  await expect(page.locator('.block-selected')).toHaveCount(3);
  await page.keyboard.press('Escape');
  await expect(page.locator('.block-selected')).toHaveCount(0);
});

test('alignment lines show while a block is dragged into line with another', async ({ page }) => {
  await drawChain(page);
  await dragBy(block(page, 'gain 2'), 0, 100);
  const grip = await middle(block(page, 'gain 2'));
  await page.mouse.move(grip.x, grip.y);
  await page.mouse.down();
  await page.mouse.move(grip.x, grip.y - 50, { steps: 4 });
  await page.mouse.move(grip.x, grip.y - 100, { steps: 6 });
  await expect(page.locator('.alignment-lines line').first()).toBeAttached();
  await page.mouse.up();
  await expect(page.locator('.alignment-lines')).toHaveCount(0);
});

test('copied blocks are a drawing as text, and paste with fresh names and the parameters they miss', async ({
  page,
  context,
}) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write']);
  await openWorkedDrawing(page);
  await block(page, 'gain K_p').click();
  await page.keyboard.press('Control+c');
  const text = await page.evaluate(() => navigator.clipboard.readText());
  const copied = JSON.parse(text);
  expect(copied.format).toBe('poleward-diagram');
  expect(copied.parameters.map(({ name }: { name: string }) => name)).toEqual(['K_p']);
  await page.keyboard.press('Control+v');
  await expect(page.getByRole('group', { name: /^gain K_p(,|$)/ })).toHaveCount(2);
  await page.keyboard.press('Control+z');
  await expect(page.getByRole('group', { name: /^gain K_p(,|$)/ })).toHaveCount(1);

  await openEmptySheet(page);
  await sheet(page).focus();
  await page.keyboard.press('Control+v');
  await expect(block(page, 'gain K_p')).toBeVisible();
  await expect(notice(page)).toContainText('Brought K_p.');
  await page.keyboard.press('Control+d');
  await expect(blocks(page)).toHaveCount(2);
  await page.keyboard.press('Control+x');
  await expect(blocks(page)).toHaveCount(1);

  await page.evaluate(() => navigator.clipboard.writeText('a shopping list'));
  await page.keyboard.press('Control+v');
  await expect(notice(page)).toHaveText('The clipboard holds no blocks but other text. Copy some blocks first.');
  await expect(blocks(page)).toHaveCount(1);
});

test('a block is found by a parameter and gone to', async ({ page }) => {
  await openWorkedDrawing(page);
  await sheet(page).focus();
  await page.keyboard.press('Control+f');
  const field = page.getByRole('combobox', { name: 'Find a block' });
  await expect(field).toBeFocused();
  await field.fill('tau');
  await expect(page.getByRole('listbox', { name: 'Blocks found' }).getByRole('option')).toHaveCount(1);
  await field.press('Enter');
  await expect(field).toHaveCount(0);
  await expect(page.locator('.block-selected')).toHaveCount(1);
  await expect(block(page, 'gain 1/tau')).toBeFocused();
  await page.getByRole('button', { name: 'Find' }).click();
  await field.fill('nowhere');
  await expect(page.locator('.find-count')).toHaveText('Nothing holds “nowhere”.');
  await field.press('Escape');
  await expect(field).toHaveCount(0);
});

test('the whole drawing is arranged as one undo step, always the same, and the model stays', async ({ page }) => {
  await openWorkedDrawing(page);
  const entries = () =>
    page.locator('.react-flow__node').evaluateAll(nodes => nodes.map(node => node.getAttribute('style')));
  const before = await entries();
  const entriesBefore = await matrix(page).textContent();
  await page.getByRole('button', { name: 'Arrange' }).click();
  await expect(notice(page)).toHaveText('Arranged the drawing.');
  const after = await entries();
  expect(after).not.toEqual(before);
  await page.keyboard.press('l');
  await expect.poll(entries).toEqual(after);
  await page.keyboard.press('Control+z');
  await expect.poll(entries).toEqual(before);
  expect(await matrix(page).textContent()).toBe(entriesBefore);
});

test('pointing at a block shows its value, unit and states', async ({ page }) => {
  await openWorkedDrawing(page);
  await block(page, 'gain k').hover();
  const card = page.locator('.block-card');
  await expect(card).toContainText('gain k');
  // The drawing's k is 12 N/m; it is fed by the speed and makes the change of the tension.
  await expect(card).toContainText('12');
  await expect(card).toContainText('dF/dt');
  await page.keyboard.press('Escape');
  await expect(card).toHaveCount(0);
});

test('from afar only frames and symbols are drawn', async ({ page }) => {
  await openWorkedDrawing(page);
  const value = block(page, 'gain k').locator('.writing-value').first();
  await expect(value).toBeVisible();
  for (let press = 0; press < 8; press++) {
    await page.getByRole('button', { name: 'Zoom out' }).click();
    await page.waitForTimeout(200);
  }
  await expect(value).toBeHidden();
  await page.getByRole('button', { name: 'Fit' }).click();
  await expect(value).toBeVisible();
});
