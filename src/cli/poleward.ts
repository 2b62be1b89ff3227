#!/usr/bin/env node
/** Where Node starts the command line: arguments and machine go in, the exit status comes out. */

import { main } from './main.ts';
import { nodeIo } from './node-io.ts';

process.exitCode = await main(process.argv.slice(2), nodeIo);
