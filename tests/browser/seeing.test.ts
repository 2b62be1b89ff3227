/** Seeing from near and far, with more contrast and with forced colours: what is told apart stays told apart. */

import { expect, type Locator, type Page, test } from 'playwright/test';
import { block, openEmptySheet, openWorkedDrawing, writeBlocks } from './sheet-page.ts';

const frameOf = (of: Locator): Locator => of.locator('.ink-paper').first();

async function strokeOf(of: Locator): Promise<readonly string[]> {
  return of.evaluate(element => {
    const { stroke, strokeWidth, strokeDasharray } = getComputedStyle(element);
    return [stroke, strokeWidth, strokeDasharray];
  });
}

/** A loop with gain one, u → sum → 1 → sum, beside a gain that is selected and one that is not. */
async function drawStates(page: Page): Promise<void> {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '++', '1', '@sum+', '4', '5');
  await expect(block(page, 'gain 1').locator('.block')).toHaveClass(/block-wrong/);
  await block(page, 'gain 4').click();
}

for (const colorScheme of ['light', 'dark'] as const) {
  test(`in forced colours, ${colorScheme}, wrong, selected and plain blocks differ without their colours`, async ({
    page,
  }) => {
    await page.emulateMedia({ forcedColors: 'active', colorScheme });
    await drawStates(page);
    const [wrong, selected, plain] = await Promise.all(
      ['gain 1', 'gain 4', 'gain 5'].map(name => strokeOf(frameOf(block(page, name)))),
    );
    expect(new Set([wrong, selected, plain].map(stroke => stroke?.slice(1).join())).size).toBe(3);
    const paints = await page.evaluate(() => {
      const probe = document.createElement('i');
      document.body.append(probe);
      const colour = (name: string) => {
        probe.style.color = name;
        return getComputedStyle(probe).color;
      };
      const both = { ink: colour('CanvasText'), marked: colour('Highlight') };
      probe.remove();
      return both;
    });
    expect(plain?.[0]).toBe(paints.ink);
    expect(selected?.[0]).toBe(paints.marked);
  });
}

test('in forced colours the dot over a state and the slider are there', async ({ page }) => {
  await page.emulateMedia({ forcedColors: 'active' });
  await openWorkedDrawing(page);
  const adjust = (of: Locator, pseudo?: string) =>
    of.evaluate((element, part) => getComputedStyle(element, part).forcedColorAdjust, pseudo);
  expect(await adjust(page.locator('.system-matrix-dotted').first(), '::before')).toBe('none');
  expect(await adjust(page.getByRole('slider').first())).toBe('none');
});

test('with more contrast the drawing is black on white, or white on black, in broader lines', async ({ page }) => {
  await openWorkedDrawing(page);
  const frame = frameOf(block(page, 'gain K_p'));
  expect(await strokeOf(frame)).toEqual(['rgb(30, 43, 56)', '1.4px', 'none']);
  await page.emulateMedia({ contrast: 'more' });
  expect(await strokeOf(frame)).toEqual(['rgb(0, 0, 0)', '2px', 'none']);
  await page.emulateMedia({ contrast: 'more', colorScheme: 'dark' });
  expect(await strokeOf(frame)).toEqual(['rgb(255, 255, 255)', '2px', 'none']);
  await page.getByRole('button', { name: /^Colours: system/ }).click();
  expect(await strokeOf(frame)).toEqual(['rgb(0, 0, 0)', '2px', 'none']);
});

test('from afar what is written goes step by step, and frames say what is in them', async ({ page }) => {
  await openEmptySheet(page);
  await writeBlocks(page, 'u>', '1/s speed', '>y');
  await block(page, 'integrator speed').click();
  await page.keyboard.press('b');
  await page.getByLabel('Title of the frame').fill('plant');
  await page.keyboard.press('Enter');
  const name = block(page, 'integrator speed').locator('.writing-name').first();
  const symbol = block(page, 'integrator speed').locator('.writing-symbol').first();
  const title = page.locator('.annotation-frame .writing');
  const height = async () => (await title.boundingBox())?.height ?? 0;
  await expect(name).toBeVisible();
  const zoomOut = page.getByRole('button', { name: 'Zoom out' });
  while ((await page.locator('.sheet-far').count()) === 0) {
    await zoomOut.click();
    await page.waitForTimeout(200);
  }
  await expect(name).toBeHidden();
  await expect(symbol).toBeVisible();
  expect(await height()).toBeGreaterThan(8);
  while ((await page.locator('.sheet-farther').count()) === 0) {
    await zoomOut.click();
    await page.waitForTimeout(200);
  }
  await expect(symbol).toBeHidden();
  expect(await height()).toBeGreaterThan(8);
});

test('with reduced motion nothing glides when the drawing is arranged', async ({ page }) => {
  await openWorkedDrawing(page);
  await block(page, 'gain K_p').click();
  await page.keyboard.press('b');
  await page.getByLabel('Title of the frame').press('Enter');
  await expect(page.locator('.annotation-frame')).toBeVisible();
  const glides = () =>
    page.evaluate(() => {
      const sheet = document.querySelector('.sheet');
      sheet?.classList.add('sheet-gliding');
      const moving = ['.react-flow__node', '.annotation', '.react-flow__edges'].map(selector => {
        const style = getComputedStyle(document.querySelector(selector) ?? document.body);
        return style.transitionDuration !== '0s' || style.animationName !== 'none';
      });
      sheet?.classList.remove('sheet-gliding');
      return moving;
    });
  expect(await glides()).toEqual([true, true, true]);
  await page.emulateMedia({ reducedMotion: 'reduce' });
  expect(await glides()).toEqual([false, false, false]);
});
