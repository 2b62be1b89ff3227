/**
 * What the hand sees, in Chromium on the built page: frames while a block is dragged, while the sheet is panned and zoomed,
 * a slider up to the new curve, and the first load up to the first matrices.
 */

import type { Browser, Page } from 'playwright/test';
import type { Benchmark } from './bench.ts';
import { drawingWithParameter, drawingWithStep, onBuiltPage, openDrawing } from './built-page.ts';

const GOALS: ReadonlyMap<number, number> = new Map([
  [200, 17],
  [1000, 25],
  [3000, 35],
]);
const DRAG_STEPS = 80;
const SLIDER_SIZE = 200;
const SLIDER_STEPS = 40;
const COLD_LOADS = 5;
const VIEWPORT = { width: 1440, height: 900 };

/** Begins to note the time between frames; `noted` ends it and hands back milliseconds. */
async function noteFrames(page: Page): Promise<() => Promise<number[]>> {
  const recorder = await page.evaluateHandle(() => {
    const state = { times: [] as number[], last: 0, isOver: false };
    const tick = (now: number) => {
      if (state.last > 0) state.times.push(now - state.last);
      state.last = now;
      if (!state.isOver) requestAnimationFrame(tick);
    };
    requestAnimationFrame(tick);
    return state;
  });
  return () =>
    recorder.evaluate(state => {
      state.isOver = true;
      return state.times;
    });
}

/** The middle of a block that nothing covers, in pixels of the page. */
function freeBlock(page: Page): Promise<{ x: number; y: number }> {
  return page.evaluate(() => {
    const found = [...document.querySelectorAll('.react-flow__node')].flatMap(node => {
      const { x, y, width, height } = node.getBoundingClientRect();
      const middle = { x: x + width / 2, y: y + height / 2 };
      const top = document.elementFromPoint(middle.x, middle.y);
      return top !== null && node.contains(top) ? [middle] : [];
    });
    const middle = found[Math.floor(found.length / 2)];
    if (middle === undefined) throw new Error('no block lies free');
    return middle;
  });
}

/** Drags one block to and fro; frame times, and whether the block has moved. */
async function dragFrames(page: Page): Promise<number[]> {
  const { x, y } = await freeBlock(page);
  const styles = () =>
    page.locator('.react-flow__node').evaluateAll(nodes => nodes.map(node => node.getAttribute('style')).join(';'));
  const before = await styles();
  await page.mouse.move(x, y);
  await page.mouse.down();
  const noted = await noteFrames(page);
  for (let i = 1; i <= DRAG_STEPS; i++) await page.mouse.move(x + i, y + 40 * Math.sin(i / 12));
  const times = await noted();
  const during = await styles();
  await page.mouse.up();
  if (during === before) throw new Error('the drag moved nothing');
  return times;
}

/** Pans and zooms by the wheel; frame times. Throws where the view stood still. */
async function wheelFrames(page: Page, zooms: boolean): Promise<number[]> {
  const view = () => page.locator('.react-flow__viewport').getAttribute('style');
  const before = await view();
  await page.mouse.move(500, 400);
  if (zooms) await page.keyboard.down('Control');
  const noted = await noteFrames(page);
  for (let i = 1; i <= DRAG_STEPS; i++) {
    await page.mouse.wheel(zooms ? 0 : 12, i <= DRAG_STEPS / 2 + 5 ? -12 : 12);
  }
  const times = await noted();
  if (zooms) await page.keyboard.up('Control');
  if ((await view()) === before) throw new Error('the view did not change');
  return times;
}

/** Milliseconds from a slider's input event to the frame with a new step curve, and the frames in between that were missed. */
function sliderTimes(page: Page): Promise<{ times: number[]; missed: number }> {
  return page.evaluate(async steps => {
    const slider = document.querySelector<HTMLInputElement>('[aria-label="Slider of k"]');
    const plot = document.querySelector('.step-plot .plot-svg');
    if (slider === null || plot === null) throw new Error('the page has no slider or no step response');
    const setValue = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set;
    const times: number[] = [];
    let missed = 0;
    const place = Number(slider.value);
    for (let step = 1; step <= steps; step++) {
      const start = performance.now();
      const drawn = new Promise<boolean>(resolve => {
        const limit = setTimeout(() => resolve(false), 500);
        const observer = new MutationObserver(() => {
          observer.disconnect();
          clearTimeout(limit);
          requestAnimationFrame(() => resolve(true));
        });
        observer.observe(plot, { childList: true, subtree: true, characterData: true, attributes: true });
      });
      setValue?.call(slider, String(place + step));
      slider.dispatchEvent(new Event('input', { bubbles: true }));
      if (await drawn) {
        const time = performance.now() - start;
        times.push(time);
        missed += Math.max(0, Math.ceil(time / (1000 / 60)) - 1);
      }
      await new Promise(resolve => setTimeout(resolve, 60));
    }
    return { times, missed };
  }, SLIDER_STEPS);
}

/** Milliseconds from asking for the page to its first matrix, each time in a context without anything kept. */
async function coldLoads(browser: Browser, address: string): Promise<number[]> {
  const times: number[] = [];
  for (let load = 0; load < COLD_LOADS; load++) {
    const context = await browser.newContext({ viewport: VIEWPORT });
    const page = await context.newPage();
    await page.addInitScript(() => {
      const look = () => {
        if (document.querySelector('.results td') === null) requestAnimationFrame(look);
        else document.documentElement.dataset['firstMatrix'] = String(performance.now());
      };
      requestAnimationFrame(look);
    });
    await page.goto(address);
    await page.waitForFunction(() => document.documentElement.dataset['firstMatrix'] !== undefined);
    times.push(await page.evaluate(() => Number(document.documentElement.dataset['firstMatrix'])));
    await context.close();
  }
  return times;
}

/** Least, median and 95 % of them. */
function spread(times: readonly number[]): string {
  const sorted = times.toSorted((a, b) => a - b);
  const at = (share: number) => sorted[Math.floor(share * (sorted.length - 1))]?.toFixed(1) ?? 'none';
  return `${at(0)} | ${at(0.5)} | ${at(0.95)}`;
}

async function measured(browser: Browser, address: string): Promise<readonly string[]> {
  const rows = [
    '| what | blocks | least ms | median ms | 95 % within ms | times | goal ms |',
    '| :--- | -----: | -------: | --------: | -------------: | ----: | ------: |',
  ];
  const lines: string[] = [];
  const add = (what: string, size: number, times: readonly number[], goal: string) => {
    const row = `| ${what} | ${size} | ${spread(times)} | ${times.length} | ${goal} |`;
    rows.push(row);
    process.stderr.write(`${row}\n`); // the large drawings take minutes: show that it goes on
  };
  const page = await browser.newPage({ viewport: VIEWPORT });
  await openDrawing(page, address, drawingWithStep(SLIDER_SIZE));
  const { times, missed } = await sliderTimes(page);
  await page.close();
  add('slider to new curve', SLIDER_SIZE, times, '17');
  lines.push(
    `Slider: ${times.length} of ${SLIDER_STEPS} steps came to a new curve within 0.5 s, ${missed} frames missed on the way.`,
  );
  add('first load to first matrix', 0, await coldLoads(browser, address), '');
  for (const [size, goal] of GOALS) {
    const page = await browser.newPage({ viewport: VIEWPORT });
    await openDrawing(page, address, drawingWithParameter(size));
    add('drag, frame', size, await dragFrames(page), String(goal));
    add('pan, frame', size, await wheelFrames(page, false), '');
    add('zoom, frame', size, await wheelFrames(page, true), '');
    await page.close();
  }
  return [rows.join('\n'), ...lines];
}

const benchmark: Benchmark = {
  title: 'The sheet under the hand',
  note: 'Chromium without a graphics processor, the built page; a frame is the time between two animation frames. First load: the worked drawing, from the local server, nothing kept.',
  families: [],
  remarks: () => onBuiltPage(measured),
};

export default benchmark;
