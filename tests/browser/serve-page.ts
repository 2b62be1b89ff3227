/** Builds the page where it is older than its sources and serves it while the browser tests run. */

import { fileURLToPath } from 'node:url';
import { buildPage } from '../../.tools/build.mjs';
import { serve } from '../../.tools/static-server.mjs';

/** Tells the workers where the page is in POLEWARD_PAGE; the answer takes the server down. */
export default async function servePage(): Promise<() => Promise<void>> {
  await buildPage({ show: false });
  const server = await serve(fileURLToPath(new URL('../../dist', import.meta.url)), { port: 0, host: '127.0.0.1' });
  process.env['POLEWARD_PAGE'] = `http://127.0.0.1:${server.port}/`;
  return server.close;
}
