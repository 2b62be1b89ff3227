/**
 * `npm start [-- --port 5000] [--host]`: from a fresh checkout to the page in the browser. Installs what is missing, builds
 * where the sources are newer than the build, serves it and says where in one line. Ctrl-C ends it.
 */

import { networkInterfaces } from 'node:os';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { buildPage } from './build.mjs';
import { installMissing } from './install-missing.mjs';
import { root } from './project.mjs';
import { serve } from './static-server.mjs';

const DEFAULT_PORT = 4280;

/** Port and host that were asked for; null after saying what is wrong with them. */
function readOptions() {
  try {
    const { values } = parseArgs({ options: { port: { type: 'string' }, host: { type: 'boolean', default: false } } });
    const port = values.port === undefined ? null : Number(values.port);
    if (port !== null && !(Number.isInteger(port) && port >= 0 && port <= 65535)) {
      throw new Error(`--port ${values.port} is not a port. Write a whole number from 0 to 65535.`);
    }
    return { port, host: values.host ? '0.0.0.0' : '127.0.0.1' };
  } catch (error) {
    process.stderr.write(`${error.message}\nUsage: npm start [-- --port NUMBER] [--host]\n`);
    return null;
  }
}

/** Listens on the port that was asked for, or on the default one, or where that is taken on any that is free. */
async function listen({ port, host }) {
  try {
    return await serve(join(root, 'dist'), { port: port ?? DEFAULT_PORT, host });
  } catch (error) {
    if (error.code === 'EADDRINUSE' && port === null) return serve(join(root, 'dist'), { port: 0, host });
    if (error.code === 'EADDRINUSE')
      throw new Error(`Port ${port} is taken. Give another, or none for any that is free.`);
    if (error.code === 'EACCES') throw new Error(`Port ${port} may not be opened by this user. Give one above 1023.`);
    throw error;
  }
}

/** The one line: where the page is, from this machine and, with --host, from the others on its network. */
function announcement(server, { port, host }) {
  const taken = server.port;
  const machines = Object.values(networkInterfaces())
    .flat()
    .filter(({ family, internal }) => family === 'IPv4' && !internal);
  const hosts = host === '0.0.0.0' ? ['localhost', ...machines.map(({ address }) => address)] : ['localhost'];
  const note = port === null && taken !== DEFAULT_PORT ? ` (port ${DEFAULT_PORT} is taken)` : '';
  return `Poleward is at ${hosts.map(name => `http://${name}:${taken}/`).join(' and ')}${note}. Ctrl-C ends it.\n`;
}

const options = readOptions();
if (options === null) process.exitCode = 2;
else {
  try {
    installMissing();
    await buildPage({ show: false });
    const server = await listen(options);
    process.stdout.write(announcement(server, options));
    for (const signal of ['SIGINT', 'SIGTERM']) {
      process.once(signal, () => server.close());
    }
  } catch (error) {
    process.stderr.write(`${error.message}\n`);
    process.exitCode = 1;
  }
}
