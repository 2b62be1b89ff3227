/** What cannot be used is refused with a sentence, and the work in hand stays as it was. */

import { expect, type Page, test } from 'playwright/test';
import { block, blocks, expectMatrix, openEmptySheet, writeBlocks } from './sheet-page.ts';

async function drop(page: Page, name: string, content: string): Promise<void> {
  const transfer = await page.evaluateHandle(
    ([file, body]) => {
      const data = new DataTransfer();
      data.items.add(new File([body ?? ''], file ?? ''));
      return data;
    },
    [name, content],
  );
  await page.locator('.page').dispatchEvent('drop', { dataTransfer: transfer });
}

const said = (page: Page, words: string | RegExp) => page.getByRole('status').filter({ hasText: words });

test.describe('a dropped file', () => {
  const files: [string, string, RegExp][] = [
    ['no JSON', 'not a drawing at all', /loop\.json: .*JSON/],
    ['of another format', '{"format":"recipe","version":1}', /loop\.json: .*poleward-diagram/],
    ['of a later version', '{"format":"poleward-diagram","version":2}', /loop\.json: .*version/],
    ['larger than 4 MiB', ' '.repeat(4 * 1024 * 1024 + 1), /larger than 4 MiB/],
    ['nested too deep', '['.repeat(200_000), /loop\.json: /],
  ];
  for (const [what, content, words] of files) {
    test(`${what} is refused and the sheet stays`, async ({ page }) => {
      await openEmptySheet(page);
      await writeBlocks(page, '1/s level');
      await drop(page, 'loop.json', content);
      await expect(said(page, words)).toBeVisible();
      await expect(block(page, 'integrator level')).toBeVisible();
    });
  }
});

test('a damaged link is refused and the work in hand stays', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, '1/s level');
  await page.evaluate(() => {
    window.location.hash = '#d1=AAAA';
  });
  await expect(said(page, /link/)).toBeVisible();
  await expect(block(page, 'integrator level')).toBeVisible();
});

test('a value that is no expression stays in its field with what to write', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '3', '1/s x', '>y');
  await block(page, 'gain 3').dblclick();
  await page.getByLabel('gain', { exact: true }).fill('2 k');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('alert')).toContainText('Write 2*k.');
  await expect(page.getByLabel('gain', { exact: true })).toHaveValue('2 k');
  await page.keyboard.press('Escape');
  await expectMatrix(page, [
    ['0', '3'],
    ['1', '0'],
  ]);
});

test('text that is no block stays in the line with what to write', async ({ page }) => {
  await openEmptySheet(page);
  const line = page.getByLabel('Write a block', { exact: true });
  await line.fill('2 k');
  await line.press('Enter');
  await expect(page.locator('#write-says')).toHaveText('"2 k" is not an expression. Write 2*k.');
  await expect(line).toHaveValue('2 k');
  await expect(blocks(page)).toHaveCount(0);
});

test('a parameter without a value is named in the results and found from there', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', 'k_1', '1/s x', '>y');
  await page.getByRole('button', { name: 'Remove parameter k_1' }).click();
  const problems = page.getByRole('list', { name: 'Problems' });
  await expect(problems).toContainText('k_1');
  await page.keyboard.press('Control+z');
  await expectMatrix(page, [
    ['0', '1'],
    ['1', '0'],
  ]);
});
