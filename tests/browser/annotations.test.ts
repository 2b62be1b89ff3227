/** Texts and frames on the sheet, by mouse and by key. Places follow from what the hand does: squares of 20 sheet units. */

import { expect, type Locator, type Page, test } from 'playwright/test';
import { block, dragBy, matrixCell, openEmptySheet, openWorkedDrawing, writeBlocks } from './sheet-page.ts';

const sheet = (page: Page): Locator => page.locator('.sheet');
const notice = (page: Page): Locator => page.locator('.notice');
const annotation = (page: Page, name: string | RegExp): Locator =>
  page.locator('.annotations').getByRole('group', { name });
const hold = (of: Locator): Locator => of.locator('.annotation-hold');

/** Left, top, width and height on the sheet, in its own units. */
async function placeOf(of: Locator): Promise<readonly number[]> {
  return of.evaluate(({ style }) => [style.left, style.top, style.width, style.height].map(Number.parseFloat));
}

async function boxOf(of: Locator): Promise<{ x: number; y: number; width: number; height: number }> {
  const box = await of.boundingBox();
  if (box === null) throw new Error('not on the page');
  return box;
}

/** A chain u → 2 → y with a frame around the gain. */
async function frameGain(page: Page): Promise<void> {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '2', '>y');
  await block(page, 'gain 2').click();
  await page.keyboard.press('b');
  await page.getByLabel('Title of the frame').fill('amplifier');
  await page.keyboard.press('Enter');
}

test('a text is written by key, wrapped, read out, written anew, moved, sized and removed, all with undo', async ({
  page,
}) => {
  await openEmptySheet(page);
  await sheet(page).focus();
  await page.keyboard.press('t');
  await page.getByLabel('Text on the sheet').fill('the gain K_p is the one that was measured on the bench');
  await page.keyboard.press('Enter');
  const text = annotation(page, /^text the gain K_p is/);
  await expect(text).toBeFocused();
  await expect(text.locator('text')).toHaveCount(2);
  await expect(notice(page)).toContainText('Placed text the gain K_p is');
  const [left = 0, top = 0, width = 0, height = 0] = await placeOf(text);
  expect([width, height]).toEqual([240, 40]);

  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('Shift+ArrowDown');
  expect(await placeOf(text)).toEqual([left + 20, top + 100, width, height]);
  await page.keyboard.press('Alt+ArrowLeft');
  expect((await placeOf(text))[2]).toBe(220);
  await page.keyboard.press('Enter');
  await page.getByLabel('Text on the sheet').fill('short');
  await page.keyboard.press('Escape');
  await expect(text).toBeFocused();
  await page.keyboard.press('Enter');
  await page.getByLabel('Text on the sheet').fill('short');
  await page.keyboard.press('Enter');
  await expect(annotation(page, 'text short')).toBeFocused();
  await page.keyboard.press('Delete');
  await expect(page.locator('.annotation')).toHaveCount(0);
  for (let step = 0; step < 5; step += 1) await page.keyboard.press('Control+z');
  expect(await placeOf(text)).toEqual([left, top, width, height]);
  await page.keyboard.press('Control+z');
  await expect(page.locator('.annotation')).toHaveCount(0);
});

test('a text in quotes in the line, and a double click on paper, place one', async ({ page }) => {
  await openEmptySheet(page);
  const line = page.getByLabel('Write a block', { exact: true });
  await line.fill('"speed is in rad/s"');
  await expect(page.locator('#write-says')).toHaveText('Enter places this text on the sheet');
  await line.press('Enter');
  await expect(annotation(page, 'text speed is in rad/s')).toBeVisible();
  await page.locator('.react-flow__pane').dblclick({ position: { x: 200, y: 500 } });
  await page.getByLabel('Text on the sheet').fill('second');
  await page.keyboard.press('Shift+Enter');
  await page.keyboard.type('line');
  await page.keyboard.press('Enter');
  await expect(annotation(page, 'text second line').locator('text')).toHaveText(['second', 'line']);
  await page.keyboard.press('t');
  await page.keyboard.press('Escape');
  await expect(page.locator('.annotation')).toHaveCount(2);
});

test('a frame dragged by its title edge takes its blocks along, as one undo step, and not what is outside', async ({
  page,
}) => {
  await frameGain(page);
  const frame = annotation(page, 'frame amplifier, around gain 2');
  const [left = 0, top = 0] = await placeOf(frame);
  const [gain, input] = [await boxOf(block(page, 'gain 2')), await boxOf(block(page, 'input u'))];
  await dragBy(hold(frame), 80, 60);
  const [newLeft = 0, newTop = 0] = await placeOf(frame);
  const moved = await boxOf(block(page, 'gain 2'));
  const zoom = gain.width / (moved.width || 1);
  expect(zoom).toBeCloseTo(1, 3);
  expect([newLeft - left, newTop - top].map(step => Math.abs(step % 20))).toEqual([0, 0]);
  expect(moved.x - gain.x).toBeGreaterThan(40);
  expect((moved.x - gain.x) / (moved.y - gain.y)).toBeCloseTo((newLeft - left) / (newTop - top), 1);
  expect(await boxOf(block(page, 'input u'))).toEqual(input);
  await page.getByRole('button', { name: 'Undo' }).click();
  expect(await placeOf(frame)).toEqual([left, top, ...(await placeOf(frame)).slice(2)]);
  expect(await boxOf(block(page, 'gain 2'))).toEqual(gain);
});

test('a frame is sized by its grip and by key, and lets blocks and wires in it be taken hold of', async ({ page }) => {
  await frameGain(page);
  const frame = annotation(page, /^frame amplifier/);
  const [, , width = 0, height = 0] = await placeOf(frame);
  await dragBy(frame.locator('.annotation-size'), 100, 60);
  const [, , wider = 0, higher = 0] = await placeOf(frame);
  expect(wider).toBeGreaterThan(width);
  expect(higher).toBeGreaterThan(height);
  expect([wider % 20, higher % 20]).toEqual([0, 0]);
  await frame.focus();
  await page.keyboard.press('Alt+ArrowRight');
  await page.keyboard.press('Alt+ArrowUp');
  expect((await placeOf(frame)).slice(2)).toEqual([wider + 20, higher - 20]);
  await block(page, 'gain 2').click();
  await expect(block(page, 'gain 2')).toHaveClass(/selected/);
  await expect(frame).not.toHaveClass(/annotation-selected/);
});

test('frame and block are duplicated, copied and pasted together', async ({ page, context }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write']);
  await frameGain(page);
  await hold(annotation(page, /^frame amplifier/)).click();
  await block(page, 'gain 2').click({ modifiers: ['Shift'] });
  await page.keyboard.press('Control+d');
  await expect(notice(page)).toContainText('Duplicated 1 block and 1 annotation.');
  await expect(page.locator('.annotation-frame')).toHaveCount(2);
  await page.keyboard.press('Control+c');
  await expect(notice(page)).toContainText('Copied 1 block and 1 annotation.');
  expect(await page.evaluate(() => navigator.clipboard.readText())).toContain('"annotations"');
  await page.keyboard.press('Control+v');
  await expect(notice(page)).toContainText('Pasted 1 block and 1 annotation.');
  await expect(page.locator('.annotation-frame')).toHaveCount(3);
  await page.keyboard.press('Delete');
  await expect(notice(page)).toContainText('Removed 1 block and 1 annotation.');
  await expect(page.locator('.annotation-frame')).toHaveCount(2);
});

test('what is written in a text is found, and arranging takes a frame to its blocks', async ({ page }) => {
  await openWorkedDrawing(page);
  for (const [name, modifiers] of [
    ['gain K_p', []],
    ['gain K_i', ['Shift']],
  ] as const) {
    await block(page, name).click({ modifiers: [...modifiers] });
  }
  await page.getByRole('button', { name: 'Frame', exact: true }).click();
  await page.getByLabel('Title of the frame').fill('the controller');
  await page.keyboard.press('Enter');
  const around = /^frame the controller, around .*gain K_p and gain K_i/;
  await expect(annotation(page, around)).toBeVisible();
  await page.keyboard.press('Escape');
  await page.keyboard.press('l');
  await expect(notice(page)).toContainText('Arranged the drawing.');
  await expect(annotation(page, around)).toBeVisible();
  await page.keyboard.press('Control+f');
  await page.getByLabel('Find a block').fill('troller');
  await page.keyboard.press('Enter');
  await expect(annotation(page, around)).toBeFocused();
  await expect(notice(page)).toContainText('Found frame the controller.');
});

test('texts and frames leave the matrices alone and stand in the picture and in the file', async ({ page }) => {
  await openWorkedDrawing(page);
  const before = await matrixCell(page, 1, 1).textContent();
  await writeBlocks(page, '"kept with the drawing"');
  expect(await matrixCell(page, 1, 1).textContent()).toBe(before);
  await page.emulateMedia({ media: 'print' });
  await expect(page.locator('.printed-sheet').getByText('kept with the drawing')).toBeVisible();
  await page.emulateMedia({ media: 'screen' });
  await page.waitForTimeout(1500);
  await page.reload();
  await expect(annotation(page, 'text kept with the drawing')).toBeVisible();
});

test('a selecting frame takes texts along with blocks, and dragging one of the blocks takes all of it', async ({
  page,
}) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '2', '>y', '"beside"');
  await sheet(page).focus();
  await page.keyboard.press('z');
  await page.waitForTimeout(400);
  const text = annotation(page, 'text beside');
  const [first, last, note] = [
    await boxOf(block(page, 'input u')),
    await boxOf(block(page, 'output y')),
    await boxOf(text),
  ];
  const left = Math.min(first.x, note.x) - 40;
  const right = Math.max(last.x + last.width, note.x + note.width) + 40;
  const bottom = Math.max(last.y, note.y + note.height) + 60;
  await page.keyboard.down('Shift');
  await page.mouse.move(left, Math.min(first.y, note.y) - 40);
  await page.mouse.down();
  await page.mouse.move(right, bottom, { steps: 6 });
  await page.mouse.up();
  await page.keyboard.up('Shift');
  await expect(text).toHaveClass(/annotation-selected/);
  await expect(page.locator('.react-flow__node.selected')).toHaveCount(3);
  const nodePlace = () =>
    block(page, 'input u').evaluate(node => (node instanceof HTMLElement ? node.style.transform : ''));
  const [before, blockBefore] = [await placeOf(text), await nodePlace()];
  await page.keyboard.press('ArrowDown');
  await expect(notice(page)).toContainText('Moved 3 blocks and 1 annotation.');
  expect((await placeOf(text))[1]).toBe((before[1] ?? 0) + 20);
  await page.keyboard.press('Control+z');
  expect([await placeOf(text), await nodePlace()]).toEqual([before, blockBefore]);
  await dragBy(block(page, 'gain 2'), 0, 80);
  await expect.poll(async () => (await placeOf(text))[1] ?? 0).toBeGreaterThan((before[1] ?? 0) + 39);
  expect(await nodePlace()).not.toBe(blockBefore);
  await page.keyboard.press('Control+z');
  expect([await placeOf(text), await nodePlace()]).toEqual([before, blockBefore]);
});

test('by touch, a frame is dragged by its title edge with its block', async ({ browser, baseURL }) => {
  const context = await browser.newContext({
    viewport: { width: 390, height: 844 },
    hasTouch: true,
    isMobile: true,
    ...(baseURL === undefined ? {} : { baseURL }),
  });
  const page = await context.newPage();
  await openEmptySheet(page);
  await writeBlocks(page, '2');
  await block(page, 'gain 2').tap();
  await page.getByRole('button', { name: 'Frame', exact: true }).tap();
  await page.getByLabel('Title of the frame').fill('touched');
  await page.keyboard.press('Enter');
  const frame = annotation(page, /^frame touched/);
  const [before, gain, grip] = [await placeOf(frame), await boxOf(block(page, 'gain 2')), await boxOf(hold(frame))];
  const touch = await context.newCDPSession(page);
  const at = (dx: number, dy: number) => [{ x: grip.x + grip.width / 2 + dx, y: grip.y + grip.height / 2 + dy }];
  await touch.send('Input.dispatchTouchEvent', { type: 'touchStart', touchPoints: at(0, 0) });
  for (const step of [10, 25, 40, 60]) {
    await touch.send('Input.dispatchTouchEvent', { type: 'touchMove', touchPoints: at(step, step / 2) });
  }
  await touch.send('Input.dispatchTouchEvent', { type: 'touchEnd', touchPoints: [] });
  await expect.poll(() => placeOf(frame)).not.toEqual(before);
  const [left = 0] = await placeOf(frame);
  expect(left).toBeGreaterThan(before[0] ?? 0);
  expect((await boxOf(block(page, 'gain 2'))).x).toBeGreaterThan(gain.x + 20);
  await context.close();
});

test('the title block gives way to a text', async ({ page }) => {
  await openEmptySheet(page);
  const title = page.getByRole('region', { name: 'Title block' });
  const pane = await boxOf(page.locator('.react-flow__pane'));
  const before = await boxOf(title);
  // Begun left of the title block, the text is moved under it by key.
  await page.mouse.dblclick(before.x - 60, before.y + before.height / 2);
  await page.getByLabel('Text on the sheet').fill('where the title block stood');
  await page.keyboard.press('Enter');
  for (let step = 0; step < 2; step += 1) await page.keyboard.press('Shift+ArrowRight');
  const text = await boxOf(annotation(page, /^text where/));
  expect(text.x + text.width).toBeLessThan(pane.x + pane.width);
  const overlaps = async () => {
    const box = await boxOf(title);
    return (
      box.x < text.x + text.width &&
      text.x < box.x + box.width &&
      box.y < text.y + text.height &&
      text.y < box.y + box.height
    );
  };
  await expect.poll(overlaps).toBe(false);
  expect(await boxOf(title)).not.toEqual(before);
});
