/**
 * A small static server for the built page. It sends the page's own content security policy as a header too, so that what
 * a browser is held to is the same with either. Serves files of one folder only, never a dot file or the command line.
 */

import { createReadStream, readFileSync, statSync } from 'node:fs';
import { createServer } from 'node:http';
import { extname, join, normalize, sep } from 'node:path';

const TYPES = {
  '.css': 'text/css; charset=utf-8',
  '.html': 'text/html; charset=utf-8',
  '.ico': 'image/x-icon',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.map': 'application/json; charset=utf-8',
  '.png': 'image/png',
  '.svg': 'image/svg+xml',
  '.txt': 'text/plain; charset=utf-8',
  '.wasm': 'application/wasm',
  '.webmanifest': 'application/manifest+json',
  '.woff2': 'font/woff2',
};

/** The policy that the built page carries in its meta element. */
export function policyOf(html) {
  const found = /<meta http-equiv="Content-Security-Policy" content="([^"]+)"/.exec(html);
  if (found === null) throw new Error('The built page carries no content security policy.');
  return found[1].replaceAll('&#39;', "'");
}

/**
 * Serves a folder that holds an index.html.
 *
 * @param port  0 for any free one.
 * @returns     the port it listens on, and `close`, which ends it and its connections; rejects with the system's error
 *              (code EADDRINUSE where the port is taken).
 */
export function serve(folder, { port, host }) {
  const policy = policyOf(readFileSync(join(folder, 'index.html'), 'utf8'));
  const server = createServer((request, response) => {
    const file = request.method === 'GET' || request.method === 'HEAD' ? fileFor(folder, request.url) : null;
    if (file === null) {
      response.writeHead(404, { 'content-type': TYPES['.txt'] }).end('Not found\n');
      return;
    }
    response.writeHead(200, {
      'content-type': TYPES[extname(file.path)] ?? 'application/octet-stream',
      'content-length': file.size,
      'content-security-policy': policy,
      'cache-control': 'no-cache',
      'x-content-type-options': 'nosniff',
    });
    if (request.method === 'HEAD') response.end();
    else
      createReadStream(file.path)
        .on('error', () => response.destroy())
        .pipe(response);
  });
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, () => resolve({ port: server.address().port, close: () => closeServer(server) }));
  });
}

function closeServer(server) {
  return new Promise(resolve => {
    server.close(() => resolve());
    server.closeAllConnections();
  });
}

/** The file an address stands for, with its size; null where there is none that may be served. */
function fileFor(folder, address) {
  let path;
  try {
    path = decodeURIComponent(new URL(address, 'http://localhost').pathname);
  } catch {
    return null; // not an address at all
  }
  if (path.includes('\0')) return null;
  const parts = normalize(path).split(sep).filter(Boolean);
  if (parts.some(part => part.startsWith('.')) || parts[0] === 'cli') return null;
  const full = join(folder, ...parts, path.endsWith('/') ? 'index.html' : '');
  const stat = statSync(full, { throwIfNoEntry: false });
  return stat?.isFile() ? { path: full, size: stat.size } : null;
}
