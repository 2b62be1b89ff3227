/** The sheet on paper and as a picture: one page with its title block, nothing of the page's own, black on white. */

import { readFile } from 'node:fs/promises';
import { expect, type Page, test } from 'playwright/test';
import { readPdf } from './read-pdf.ts';
import { block, openEmptySheet, openWorkedDrawing } from './sheet-page.ts';

const exporting = (page: Page) => page.getByRole('dialog', { name: 'Export' });

test('the browser prints the sheet on one page that lies across, and afterwards the page is as it was', async ({
  page,
}) => {
  const complaints: string[] = [];
  page.on('console', message => complaints.push(message.text()));
  await openWorkedDrawing(page);
  const pdf = await page.pdf({ preferCSSPageSize: true });
  expect(complaints).toEqual([]);
  const { pages, width, height, texts } = readPdf(pdf);
  expect(pages).toBe(1);
  expect(width / height).toBeGreaterThan(1.2);
  for (const text of ['Survey winch, line tension', 'Block diagram', 'Revision', 'Date of issue', 'drum and rotor']) {
    expect(texts).toContain(text);
  }
  // Nothing of the page itself.
  expect(texts.join(' ')).not.toMatch(/POLEWARD|Export|System matrix/i);
  await expect(page.locator('.printed-sheet')).toHaveCount(0);
  await expect(block(page, 'gain K_p')).toBeVisible();
});

test('on paper there is the drawing with its title block and nothing of the page, black on white in the dark theme', async ({
  page,
}) => {
  await page.emulateMedia({ colorScheme: 'dark' });
  await openWorkedDrawing(page);
  await page.emulateMedia({ media: 'print', colorScheme: 'dark' });
  const sheet = page.locator('.printed-sheet');
  await expect(sheet).toBeVisible();
  await expect(page.locator('#root')).toBeHidden();
  for (const text of ['Survey winch, line tension', 'Document type', 'Date of issue', 'parameter']) {
    await expect(sheet.locator('text').getByText(text, { exact: true })).toBeVisible();
  }
  const inks = await sheet.evaluate(element => ({
    page: getComputedStyle(document.body).backgroundColor,
    line: getComputedStyle(element.querySelector('.ink') ?? element).stroke,
    text: getComputedStyle(element.querySelector('text') ?? element).fill,
  }));
  expect(inks).toEqual({ page: 'rgb(255, 255, 255)', line: 'rgb(0, 0, 0)', text: 'rgb(0, 0, 0)' });
  await page.emulateMedia({ media: 'screen' });
  await expect(sheet).toHaveCount(0);
});

test('the key over the sheet and the button in the export dialog print', async ({ page }) => {
  await page.addInitScript(() => {
    window.print = () =>
      document.body.setAttribute('data-prints', `${Number(document.body.dataset['prints'] ?? 0) + 1}`);
  });
  await openWorkedDrawing(page);
  await page.locator('.sheet').focus();
  await page.keyboard.press('p');
  await expect(page.locator('body')).toHaveAttribute('data-prints', '1');
  await page.getByRole('button', { name: 'Export…' }).click();
  await exporting(page).getByRole('button', { name: 'Print…' }).click();
  await expect(page.locator('body')).toHaveAttribute('data-prints', '2');
});

test('a picture of what is selected holds that alone, and both kinds go to the clipboard', async ({
  page,
  context,
}) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write']);
  await openWorkedDrawing(page);
  await block(page, 'gain K_p').click();
  await page.getByRole('button', { name: 'Export…' }).click();
  const save = async () => {
    const download = page.waitForEvent('download');
    await exporting(page).getByRole('button', { name: 'Save SVG' }).click();
    return readFile(await (await download).path(), 'utf8');
  };
  const whole = await save();
  await exporting(page).getByRole('radio', { name: 'what is selected' }).check();
  const selected = await save();
  expect(whole.match(/<g transform/g)?.length).toBeGreaterThan(8);
  expect(selected.match(/<g transform/g)?.length).toBe(1);
  await exporting(page).getByRole('button', { name: 'Copy SVG' }).click();
  await expect(page.locator('.notice')).toContainText('Copied the picture as SVG text.');
  expect(await page.evaluate(() => navigator.clipboard.readText())).toBe(selected);
  await exporting(page).getByRole('button', { name: 'Copy PNG' }).click();
  await expect(page.locator('.notice')).toContainText('Copied the picture.');
  const kinds = await page.evaluate(async () => (await navigator.clipboard.read()).flatMap(({ types }) => types));
  expect(kinds).toContain('image/png');
});

test('a drawing that is higher than wide is printed upright', async ({ page }) => {
  await openEmptySheet(page);
  const blocks = Array.from({ length: 24 }, (_, i) => ({ id: `g${i}`, kind: 'gain', gain: '2', at: [0, 120 * i] }));
  const file = { format: 'poleward-diagram', version: 1, title: 'Column', parameters: [], blocks, wires: [] };
  await page.evaluate(text => {
    const dataTransfer = new DataTransfer();
    dataTransfer.items.add(new File([text], 'column.poleward.json', { type: 'application/json' }));
    document
      .querySelector('.page')
      ?.dispatchEvent(new DragEvent('drop', { bubbles: true, cancelable: true, dataTransfer }));
  }, JSON.stringify(file));
  await expect(page.locator('.react-flow__node')).toHaveCount(24);
  const { pages, width, height, texts } = readPdf(await page.pdf({ preferCSSPageSize: true }));
  expect(pages).toBe(1);
  expect(height).toBeGreaterThan(1.2 * width);
  expect(texts).toContain('Column');
});
