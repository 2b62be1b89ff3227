/** What the browser tests do with the page, in a user's terms: by role and label, by mouse and by key. */

import { expect, type Locator, type Page } from 'playwright/test';

/** Opens the page on an empty sheet. */
export async function openEmptySheet(page: Page): Promise<void> {
  await page.goto('./');
  await page.getByRole('button', { name: 'Empty sheet' }).click();
  await expect(blocks(page)).toHaveCount(0);
  await expectReady(page);
}

/** Waits until the sheet takes keys: they come with its toolbar, right after the drawing. */
async function expectReady(page: Page): Promise<void> {
  await expect(page.getByRole('toolbar', { name: 'Sheet' })).toBeVisible();
}

/** Opens the page on its worked drawing. */
export async function openWorkedDrawing(page: Page): Promise<void> {
  await page.goto('./');
  await expect(block(page, 'gain K_p')).toBeVisible();
  await expect(matrixCell(page, 1, 1)).toBeVisible();
  await expectReady(page);
}

/** Every block on the sheet. */
export function blocks(page: Page): Locator {
  return page.locator('.react-flow__node');
}

/** The block whose sentence begins with the title: `gain K_p`. */
export function block(page: Page, title: string): Locator {
  const start = title.replaceAll(/[.*+?^${}()|[\]\\]/g, '\\$&');
  return page.getByRole('group', { name: new RegExp(`^${start}(,|$)`) });
}

/** Writes one block after another in the write-a-block line. */
export async function writeBlocks(page: Page, ...texts: readonly string[]): Promise<void> {
  const line = page.getByLabel('Write a block', { exact: true });
  for (const text of texts) {
    await line.fill(text);
    await line.press('Enter');
    await expect(line).toHaveValue('');
  }
}

/** Draws a wire by dragging from an output port to an input port, counted from 0. */
export async function drawWire(from: Locator, output: number, to: Locator, input: number): Promise<void> {
  const page = from.page();
  const start = await middle(from.locator(`[data-handleid="out:${output}"]`));
  const end = await middle(to.locator(`[data-handleid="in:${input}"]`));
  await page.mouse.move(start.x, start.y);
  await page.mouse.down();
  await page.mouse.move((start.x + end.x) / 2, (start.y + end.y) / 2, { steps: 3 });
  await page.mouse.move(end.x, end.y, { steps: 3 });
  await page.mouse.up();
}

/** Drags from one point of the page by so many pixels. */
export async function dragBy(grip: Locator, dx: number, dy: number): Promise<void> {
  const page = grip.page();
  const start = await middle(grip);
  await page.mouse.move(start.x, start.y);
  await page.mouse.down();
  await page.mouse.move(start.x + dx / 2, start.y + dy / 2, { steps: 4 });
  await page.mouse.move(start.x + dx, start.y + dy, { steps: 4 });
  await page.mouse.up();
}

export async function middle(target: Locator): Promise<{ x: number; y: number }> {
  const box = await target.boundingBox();
  if (box === null) throw new Error('not on the page');
  return { x: box.x + box.width / 2, y: box.y + box.height / 2 };
}

/** The system matrix. */
export function matrix(page: Page): Locator {
  return page.getByRole('region', { name: 'System matrix' }).locator('table');
}

/** Row and column counted from 1, without the heads. */
export function matrixCell(page: Page, row: number, column: number): Locator {
  return matrix(page)
    .locator('tbody tr')
    .nth(row - 1)
    .locator('td')
    .nth(column - 1);
}

/** The entries of the system matrix as texts, row by row, without the heads. */
export async function matrixEntries(page: Page): Promise<string[][]> {
  return matrix(page)
    .locator('tbody tr')
    .evaluateAll(rows =>
      rows.map(row => Array.from(row.querySelectorAll('td'), cell => cell.textContent?.trim() ?? '')),
    );
}

/** Waits until the system matrix reads as given. */
export async function expectMatrix(page: Page, entries: readonly (readonly string[])[]): Promise<void> {
  await expect.poll(() => matrixEntries(page)).toEqual(entries);
}

/** The bottom line. */
export function verdict(page: Page): Locator {
  return page.getByRole('contentinfo');
}
