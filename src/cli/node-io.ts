/** The machine as the command line sees it, through Node. Failures of the system become problems that name the file. */

import { constants } from 'node:fs';
import { type FileHandle, open, realpath, rename, rm, stat, writeFile } from 'node:fs/promises';
import { basename, dirname, join } from 'node:path';
import { MAXIMUM_BYTES } from '../diagram/index.ts';
import { fail, ok, problem, type Result } from '../problem/index.ts';
import type { Io } from './io.ts';

/** Bytes of the mark that may stand before the text and counts as none of it. */
const BYTE_ORDER_MARK = 3;

/** The process's own streams and file system. */
export const nodeIo: Io = {
  isTerminal: process.stdout.isTTY === true,
  readFile: path => readText(path, () => open(path, constants.O_RDONLY)),
  readStandardInput: () => readChunks('Standard input', process.stdin),
  print: content => written(process.stdout, content),
  complain: line => {
    process.stderr.write(`${line}\n`);
  },
  replaceFile,
};

// Whoever reads the answer may stop before its end (`| head`); that is no fault of the answer.
process.stdout.on('error', passOverClosedPipe);
process.stderr.on('error', passOverClosedPipe);

function passOverClosedPipe(error: NodeJS.ErrnoException): void {
  if (error.code !== 'EPIPE') throw error;
}

/** Resolves when the stream has taken the content or is closed; what went wrong is told to its error listener. */
function written(stream: NodeJS.WriteStream, content: string | Uint8Array): Promise<void> {
  return new Promise(resolve => {
    stream.write(content, () => resolve());
  });
}

async function readText(name: string, start: () => Promise<FileHandle>): Promise<Result<string>> {
  let handle: FileHandle | null = null;
  try {
    handle = await start();
    return await readChunks(name, handle.createReadStream({ autoClose: false }));
  } catch (error) {
    return fail(problem('not-readable', `${name}: ${reason(error)}`));
  } finally {
    await handle?.close();
  }
}

/** All of a stream as UTF-8, a byte order mark left out; `too-large` as soon as it is. */
async function readChunks(name: string, stream: AsyncIterable<unknown>): Promise<Result<string>> {
  const chunks: Uint8Array[] = [];
  let length = 0;
  for await (const chunk of stream) {
    if (!(chunk instanceof Uint8Array)) throw new TypeError('a stream of bytes gave something else');
    chunks.push(chunk);
    length += chunk.length;
    if (length > MAXIMUM_BYTES + BYTE_ORDER_MARK) {
      return fail(problem('too-large', `${name} is larger than 4 MiB. Split the drawing into several.`));
    }
  }
  try {
    return ok(new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(chunks)));
  } catch {
    return fail(problem('not-readable', `${name} is no text in UTF-8. Save it as UTF-8.`)); // what the decoder throws
  }
}

async function replaceFile(path: string, content: string | Uint8Array): Promise<Result<null>> {
  try {
    const target = await realPath(path);
    const existing = await stat(target).catch(() => null);
    if (existing?.isDirectory()) return fail(notWritable(path, 'that is a folder. Name a file in it.'));
    // A device or a pipe is written to; only a file can be replaced.
    if (existing !== null && !existing.isFile()) await writeFile(target, content);
    else await writeBesideAndRename(target, content, existing?.mode);
    return ok(null);
  } catch (error) {
    return fail(notWritable(path, reason(error, { ENOENT: 'there is no such folder. Check the path.' })));
  }
}

/** Where a symbolic link leads, so that the file is replaced and not the link. */
async function realPath(path: string): Promise<string> {
  return realpath(path).catch(() => path);
}

async function writeBesideAndRename(target: string, content: string | Uint8Array, mode = 0o666): Promise<void> {
  const beside = join(dirname(target), `.${basename(target)}.${process.pid}`);
  try {
    const handle = await open(beside, 'wx', mode & 0o777);
    try {
      await handle.writeFile(content);
      await handle.sync();
    } finally {
      await handle.close();
    }
    await rename(beside, target);
  } catch (error) {
    await rm(beside, { force: true });
    throw error;
  }
}

const REASONS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file. Check the path.',
  ENOTDIR: 'a part of the path is no folder. Check the path.',
  EISDIR: 'that is a folder. Name a file in it.',
  EACCES: 'this user may not do that. Check the permissions.',
  EPERM: 'this user may not do that. Check the permissions.',
  EROFS: 'the disk can only be read. Name a file elsewhere.',
  ENOSPC: 'the disk is full. Make room or name a file elsewhere.',
  ENAMETOOLONG: 'the path is too long. Check the path.',
  ELOOP: 'the path leads round in a circle of links. Check the path.',
};

/** What the system has against a file, in the words of `own` first; a bug's error goes on its way. */
function reason(error: unknown, own: typeof REASONS = {}): string {
  const code = error instanceof Error && 'code' in error ? String(error.code) : null;
  if (code === null || code.startsWith('ERR_')) throw error;
  return own[code] ?? REASONS[code] ?? `the system refuses with ${code}.`;
}

function notWritable(path: string, why: string) {
  return problem('not-writable', `${path}: ${why}`);
}
