/**
 * From an edit to the new matrices on the screen, in Chromium on the built page: a parameter's value is typed, and the frame
 * that shows the new system matrix is waited for.
 */

import type { Page } from 'playwright/test';
import type { Benchmark } from './bench.ts';
import { drawingWithParameter, onBuiltPage, openDrawing } from './built-page.ts';

const SIZES = [20, 50, 200, 500, 1000];
const EDITS = 25;

/** Milliseconds from the key to the frame with the new entry, one for each edit. */
function editTimes(page: Page): Promise<number[]> {
  return page.evaluate(async edits => {
    const field = document.querySelector<HTMLInputElement>('[aria-label="Value of k"]');
    const region = document.querySelector('.results');
    if (field === null || region === null) throw new Error('the page has no field or no results');
    const times: number[] = [];
    for (let edit = 0; edit < edits; edit++) {
      const value = 1001 + edit;
      field.focus();
      field.value = `-${value}`;
      const shown = () => Array.from(region.querySelectorAll('td')).some(cell => cell.textContent === `−${value}`);
      const start = performance.now();
      const done = new Promise<void>(resolve => {
        const observer = new MutationObserver(() => {
          if (!shown()) return;
          observer.disconnect();
          requestAnimationFrame(() => resolve());
        });
        observer.observe(region, { childList: true, subtree: true, characterData: true });
      });
      field.dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter', bubbles: true }));
      await done;
      times.push(performance.now() - start);
      await new Promise(resolve => setTimeout(resolve, 120));
    }
    return times;
  }, EDITS);
}

async function inChromium(): Promise<readonly string[]> {
  const lines = [
    '| blocks | least ms | median ms | 90 % within ms |',
    '| -----: | -------: | --------: | -------------: |',
  ];
  await onBuiltPage(async (browser, address) => {
    for (const size of SIZES) {
      const page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
      await openDrawing(page, address, drawingWithParameter(size));
      const times = (await editTimes(page)).sort((a, b) => a - b);
      const at = (share: number) => (times[Math.floor(share * (times.length - 1))] ?? 0).toFixed(1);
      lines.push(`| ${size} | ${at(0)} | ${at(0.5)} | ${at(0.9)} |`);
      await page.close();
    }
  });
  return [lines.join('\n'), 'Goals: within 16 ms at 200 blocks, within 50 ms at 1,000.'];
}

const benchmark: Benchmark = {
  title: 'From an edit to new matrices on the screen',
  note: 'Chromium, the built page: key pressed, edit, worker, new system matrix, next frame. Degenerate: none of its own; each drawing has loops.',
  families: [],
  remarks: inChromium,
};

export default benchmark;
