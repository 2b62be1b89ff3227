/** The title block: sliders that move the results, the parameter table, and the corner that hides no block. */

import { expect, type Locator, type Page, test } from 'playwright/test';
import { block, matrixCell, openEmptySheet, openWorkedDrawing, writeBlocks } from './sheet-page.ts';

const slider = (page: Page, name: string): Locator => page.getByLabel(`Slider of ${name}`, { exact: true });
const valueOf = (page: Page, name: string): Locator => page.getByLabel(`Value of ${name}`, { exact: true });

/** x' = −K x + K r */
async function openOneGain(page: Page): Promise<void> {
  await openEmptySheet(page);
  await writeBlocks(page, 'r>', '+-', 'K', '1/s x', '>y');
  await valueOf(page, 'K').fill('2');
  await valueOf(page, 'K').press('Enter');
  await expect(matrixCell(page, 1, 2)).toHaveText('2');
}

test('a slider moves value, matrix and curve while it is dragged and makes one undo step', async ({ page }) => {
  await openWorkedDrawing(page);
  const thumb = slider(page, 'k');
  const box = await thumb.boundingBox();
  if (box === null) throw new Error('no slider');
  const curve = page.getByRole('region', { name: 'Time response' }).locator('svg').first();
  const before = { value: await valueOf(page, 'k').inputValue(), curve: await curve.innerHTML() };
  const y = box.y + box.height / 2;
  await page.mouse.move(box.x + box.width / 2, y);
  await page.mouse.down();
  const seen = new Set<string>();
  for (let i = 1; i <= 5; i++) {
    await page.mouse.move(box.x + box.width / 2 + 5 * i, y);
    const value = await valueOf(page, 'k').inputValue();
    seen.add(value);
    // F' = k R omega + …; the entry in column v is k
    await expect(matrixCell(page, 2, 6)).not.toHaveText('12');
  }
  expect(seen.size).toBe(5);
  await expect.poll(() => curve.innerHTML()).not.toBe(before.curve);
  await expect(page.getByRole('button', { name: 'Undo' })).toBeDisabled();
  await page.mouse.up();
  const moved = await valueOf(page, 'k').inputValue();
  expect(Number(moved)).toBeGreaterThan(12);
  expect(moved.length).toBeLessThanOrEqual(5);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(valueOf(page, 'k')).toHaveValue(before.value);
  await expect(matrixCell(page, 2, 6)).toHaveText('12');
  await expect(page.getByRole('button', { name: 'Undo' })).toBeDisabled();
});

test('arrow keys move a slider finely and coarsely, one undo step a burst, Escape takes it back', async ({ page }) => {
  await openOneGain(page);
  const thumb = slider(page, 'K');
  await thumb.focus();
  await expect(thumb).toHaveAttribute('aria-valuetext', '2');
  await page.keyboard.press('ArrowRight');
  const fine = Number(await valueOf(page, 'K').inputValue());
  expect(fine).toBeGreaterThan(2);
  expect(fine).toBeLessThan(2.05);
  await page.keyboard.press('Shift+ArrowRight');
  expect(Number(await valueOf(page, 'K').inputValue())).toBeGreaterThan(2.1);
  await expect(page.locator('.notice')).toContainText('K = 2.');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(valueOf(page, 'K')).toHaveValue('2');
  await thumb.focus();
  await page.keyboard.press('Home');
  expect(await valueOf(page, 'K').inputValue()).toBe('0.63');
  await page.keyboard.press('Escape');
  await expect(valueOf(page, 'K')).toHaveValue('2');
  await expect(matrixCell(page, 1, 2)).toHaveText('2');
  await page.keyboard.press('End');
  await page.keyboard.press('ArrowLeft');
  await page.keyboard.press('End');
  await expect(valueOf(page, 'K')).toHaveValue('6.3');
  await expect(page.locator('.notice')).toContainText('K = 6.3.');
  await expect(matrixCell(page, 1, 2)).toHaveText('63/10');
  await expect(thumb).toBeFocused();
  await page.keyboard.press('Control+z');
  await expect(valueOf(page, 'K')).toHaveValue('2');
});

test('a typed range is kept in the drawing and holds the slider', async ({ page }) => {
  await openOneGain(page);
  await slider(page, 'K').focus();
  await page.keyboard.press('Enter');
  const low = page.getByLabel('Lower end of the slider of K');
  await low.fill('5');
  await page.getByLabel('Upper end of the slider of K').fill('4');
  await page.keyboard.press('Enter');
  await expect(page.getByText('The range ends before it begins. Write the smaller end first.')).toBeVisible();
  await low.fill('0');
  await page.keyboard.press('Enter');
  await expect(slider(page, 'K')).toBeFocused();
  await page.keyboard.press('End');
  await expect(valueOf(page, 'K')).toHaveValue('4');
  await page.keyboard.press('Home');
  await expect(valueOf(page, 'K')).toHaveValue('0');
});

test('rows of a spreadsheet are pasted as one step, a bad row refuses them all', async ({ page }) => {
  await openOneGain(page);
  const paste = (text: string) =>
    valueOf(page, 'K').evaluate((field, pasted) => {
      const clipboardData = new DataTransfer();
      clipboardData.setData('text/plain', pasted);
      field.dispatchEvent(new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }));
    }, text);
  await paste('name\tvalue\tunit\tnote\nK\t3\tN/m\tfrom the test rig\nT_1\t0.2\ts');
  await expect(page.locator('.notice')).toContainText('1 parameter added, 1 updated.');
  await expect(valueOf(page, 'K')).toHaveValue('3');
  await expect(valueOf(page, 'T_1')).toHaveValue('0.2');
  await expect(page.getByRole('row', { name: /T_1/ })).toContainText('unused');
  await paste('a\t1\n2b\t3');
  await expect(page.locator('.notice')).toContainText('Row 2, 2b:');
  await expect(valueOf(page, 'a')).toHaveCount(0);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(valueOf(page, 'K')).toHaveValue('2');
  await expect(valueOf(page, 'T_1')).toHaveCount(0);
});

test('a parameter that is used and gone is listed and added again; a bad value is said beside its field', async ({
  page,
}) => {
  await openOneGain(page);
  await page.getByRole('button', { name: 'Remove parameter K' }).click();
  await page.getByRole('button', { name: 'Add parameter K with value 1' }).click();
  await expect(valueOf(page, 'K')).toHaveValue('1');
  await valueOf(page, 'K').fill('2 k');
  await valueOf(page, 'K').press('Enter');
  await expect(page.getByLabel('Title block').getByRole('alert').filter({ hasText: 'Write 2*k.' })).toBeVisible();
});

test('parameters are sorted by name and, where there are many, filtered', async ({ page }) => {
  await openOneGain(page);
  const names = Array.from({ length: 14 }, (_, i) => `k_${String.fromCharCode(110 - i)}`);
  await valueOf(page, 'K').evaluate(
    (field, pasted) => {
      const clipboardData = new DataTransfer();
      clipboardData.setData('text/plain', pasted);
      field.dispatchEvent(new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true }));
    },
    names.map(name => `${name}\t1`).join('\n'),
  );
  const table = page.getByRole('table', { name: 'Parameters' });
  await expect(table.locator('tbody tr')).toHaveCount(15);
  await page.getByRole('button', { name: 'parameter', exact: true }).click();
  await expect(
    table
      .locator('tbody tr')
      .nth(1)
      .getByLabel(/^Name of/),
  ).toHaveValue('k_a');
  await page.getByLabel('Filter parameters').fill('k_c');
  await expect(table.locator('tbody tr')).toHaveCount(1);
  await expect(page.getByLabel('Title block').getByText('1 of 15')).toBeVisible();
});

test('the title block keeps revision, date, author and notes', async ({ page }) => {
  await openOneGain(page);
  for (const [label, text] of [
    ['Revision', '7'],
    ['Date', '2026-12-01'],
    ['Author', 'A. N.'],
  ] as const) {
    await page.getByLabel(label, { exact: true }).fill(text);
    await page.getByLabel(label, { exact: true }).press('Enter');
  }
  await page.getByText('notes', { exact: true }).click();
  await page.getByLabel('Notes on the drawing').fill('first line\nsecond');
  await page.getByLabel('Notes on the drawing').blur();
  await expect(page.getByText('notes: first line')).toBeVisible();
  await expect(page.getByLabel('Author', { exact: true })).toHaveValue('A. N.');
  await expect(page.getByLabel('Date', { exact: true })).toHaveValue('2026-12-01');
});

test('the title block goes to another corner when a block comes under it', async ({ page }) => {
  await openOneGain(page);
  const titleBlock = page.getByLabel('Title block', { exact: true });
  const integrator = block(page, 'integrator x');
  const before = await titleBlock.boundingBox();
  const start = await integrator.boundingBox();
  if (before === null || start === null) throw new Error('not on the page');
  await page.mouse.move(start.x + start.width / 2, start.y + start.height / 2);
  await page.mouse.down();
  await page.mouse.move(before.x + before.width / 2, before.y + 20, { steps: 6 });
  await page.mouse.up();
  await page.mouse.move(before.x + 100, 70);
  await expect
    .poll(async () => {
      const [box, own] = await Promise.all([titleBlock.boundingBox(), integrator.boundingBox()]);
      if (box === null || own === null) return 'gone';
      const isApart =
        box.x + box.width <= own.x ||
        own.x + own.width <= box.x ||
        box.y + box.height <= own.y ||
        own.y + own.height <= box.y;
      return isApart ? 'apart' : 'covered';
    })
    .toBe('apart');
});
