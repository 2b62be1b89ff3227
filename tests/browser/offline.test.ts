/** The page without a network, and a new version of it, served from a copy of the build. */

import { appendFileSync, cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { expect, type Page, test } from 'playwright/test';
import { serve } from '../../.tools/static-server.mjs';
import { openWorkedDrawing } from './sheet-page.ts';

const DIST = fileURLToPath(new URL('../../dist', import.meta.url));

async function offlineReady(page: Page): Promise<void> {
  await page.evaluate(() => navigator.serviceWorker.ready.then(() => undefined));
  await expect.poll(() => page.evaluate(() => navigator.serviceWorker.controller !== null)).toBe(true);
}

test('after the first visit the page works without a network, matrices, dialogs and all', async ({ page, context }) => {
  await openWorkedDrawing(page);
  await offlineReady(page);
  await context.setOffline(true);
  await page.reload();
  await expect(page.getByText('every digit proved')).toBeVisible();
  await page.getByRole('button', { name: 'Export…' }).click();
  await expect(page.getByRole('dialog', { name: 'Export' })).toBeVisible();
});

test('a new version is told of, and loaded on the button only', async ({ page }) => {
  const folder = mkdtempSync(join(tmpdir(), 'page-'));
  cpSync(DIST, folder, { recursive: true, filter: source => !source.endsWith('cli') });
  const server = await serve(folder, { port: 0, host: '127.0.0.1' });
  try {
    await page.goto(`http://127.0.0.1:${server.port}/`);
    await offlineReady(page);
    await page.evaluate(() => document.body.setAttribute('data-before', 'yes'));
    const worker = join(folder, 'service-worker.js');
    writeFileSync(worker, readFileSync(worker, 'utf8').replace(/VERSION = '[0-9a-f]+'/, "VERSION = 'next'"));
    appendFileSync(join(folder, 'index.html'), '<!-- next -->');
    await page.evaluate(async () => (await navigator.serviceWorker.ready).update().then(() => undefined));
    await expect(page.getByText('A new version is there. Reload when it suits you.')).toBeVisible();
    await expect(page.locator('body[data-before]')).toHaveCount(1);
    await page.getByRole('button', { name: 'Reload' }).click();
    await expect(page.locator('body[data-before]')).toHaveCount(0);
    expect(await page.evaluate(() => caches.keys())).toEqual(['poleward next']);
  } finally {
    await server.close();
    rmSync(folder, { recursive: true });
  }
});

test('the manifest names icons that are there, in their sizes', async ({ page, request, baseURL }) => {
  await page.goto('./');
  const manifest = await (await request.get(new URL('manifest.webmanifest', baseURL).href)).json();
  for (const { src, sizes } of manifest.icons) {
    const address = new URL(src, baseURL).href;
    const width = await page.evaluate(async source => {
      const image = new Image();
      image.src = source;
      await image.decode();
      return image.naturalWidth;
    }, address);
    if (sizes !== 'any') expect(`${width}x${width}`).toBe(sizes);
  }
});
