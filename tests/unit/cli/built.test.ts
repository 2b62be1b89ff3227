/** The command line as it is started from a checkout: built, in a process of its own, with real files and pipes. */

import { spawn, spawnSync } from 'node:child_process';
import {
  chmodSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { drawingOf, referenceCase } from './cases.ts';

const script = fileURLToPath(new URL('../../../.tools/poleward.mjs', import.meta.url));
let folder = '';
let motor = '';

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'poleward-'));
  motor = join(folder, 'motor.poleward.json');
  writeFileSync(motor, drawingOf('dc-motor-symbolic'));
  poleward('--version'); // builds it where it is not
}, 60_000);
afterAll(() => rmSync(folder, { recursive: true }));

function poleward(...argv: string[]) {
  return polewardWith('', ...argv);
}

function polewardWith(input: string | Buffer, ...argv: string[]) {
  const { status, stdout, stderr } = spawnSync(process.execPath, [script, ...argv], { input, encoding: 'utf8' });
  return { status, stdout, stderr };
}

describe('started as a process', () => {
  test('it derives a file and standard input to the same bytes', () => {
    const fromFile = poleward('derive', motor);
    expect(fromFile).toMatchObject({ status: 0, stderr: '' });
    expect(JSON.parse(fromFile.stdout)).toMatchObject({ A: referenceCase('dc-motor-symbolic').expect['A'] });
    expect(polewardWith(readFileSync(motor), 'derive', '-')).toEqual(fromFile);
    expect(polewardWith(`\uFEFF${readFileSync(motor, 'utf8')}`, 'derive', '-')).toEqual(fromFile);
  });

  test('it ends with the status of what went wrong and one line on standard error', () => {
    const loop = join(folder, 'loop.poleward.json');
    writeFileSync(loop, drawingOf('unity-loop-gain-refused'));
    expect(poleward('derive', loop)).toMatchObject({ status: 3, stdout: '' });
    const missing = join(folder, 'missing.json');
    expect(poleward('derive', missing)).toEqual({
      status: 2,
      stdout: '',
      stderr: `poleward: not-readable: ${missing}: there is no such file. Check the path.\n`,
    });
    expect(poleward('derive', folder)).toEqual({
      status: 2,
      stdout: '',
      stderr: `poleward: not-readable: ${folder}: that is a folder. Name a file in it.\n`,
    });
  });

  test('it refuses what is no UTF-8, and what is too long, however long that is', () => {
    expect(polewardWith(Buffer.from([0x7b, 0xff, 0x7d]), 'check', '-')).toEqual({
      status: 2,
      stdout: '',
      stderr: 'poleward: not-readable: Standard input is no text in UTF-8. Save it as UTF-8.\n',
    });
    const tooLong = {
      status: 2,
      stdout: '',
      stderr: 'poleward: too-large: /dev/zero is larger than 4 MiB. Split the drawing into several.\n',
    };
    if (process.platform === 'linux') expect(poleward('check', '/dev/zero')).toEqual(tooLong);
    expect(polewardWith(' '.repeat(4 * 1024 * 1024 + 4), 'check', '-')).toMatchObject({ status: 2, stdout: '' });
  });

  test('it stops in silence where its reader stops reading', async () => {
    const child = spawn(process.execPath, [script, 'derive', motor], { stdio: ['ignore', 'pipe', 'pipe'] });
    child.stdout.destroy();
    let said = '';
    child.stderr.on('data', chunk => {
      said += String(chunk);
    });
    const status = await new Promise(resolve => child.on('close', resolve));
    expect({ status, said }).toEqual({ status: 0, said: '' });
  });
});

describe('--out', () => {
  test('replaces a file by a whole one, keeps its permissions and leaves nothing beside it', () => {
    const place = join(folder, 'replaced');
    mkdirSync(place);
    const path = join(place, 'motor.csv');
    writeFileSync(path, 'old');
    chmodSync(path, 0o640);
    expect(poleward('derive', motor, '--as', 'csv', '--out', path)).toEqual({ status: 0, stdout: '', stderr: '' });
    expect(readFileSync(path, 'utf8')).toBe(poleward('derive', motor, '--as', 'csv').stdout);
    expect(statSync(path).mode & 0o777).toBe(0o640);
    expect(readdirSync(place)).toEqual(['motor.csv']);
  });

  test('leaves an existing file as it was where there is no model', () => {
    const loop = join(folder, 'no-model.poleward.json');
    writeFileSync(loop, drawingOf('unity-loop-gain-refused'));
    const path = join(folder, 'kept.json');
    writeFileSync(path, 'old');
    expect(poleward('derive', loop, '--out', path).status).toBe(3);
    expect(readFileSync(path, 'utf8')).toBe('old');
  });

  test('writes where a symbolic link leads, and into a device as it is', () => {
    const target = join(folder, 'target.csv');
    const link = join(folder, 'link.csv');
    writeFileSync(target, 'old');
    symlinkSync(target, link);
    expect(poleward('derive', motor, '--as', 'csv', '--out', link).status).toBe(0);
    expect(readFileSync(target, 'utf8')).toMatch(/^row,/);
    if (process.platform !== 'linux') return;
    expect(poleward('derive', motor, '--as', 'csv', '--out', '/dev/null')).toEqual({
      status: 0,
      stdout: '',
      stderr: '',
    });
    expect(statSync('/dev/null').isCharacterDevice()).toBe(true);
  });

  test('says why a file cannot be written', () => {
    const inside = join(folder, 'no-folder', 'a.csv');
    expect(poleward('derive', motor, '--out', inside)).toEqual({
      status: 2,
      stdout: '',
      stderr: `poleward: not-writable: ${inside}: there is no such folder. Check the path.\n`,
    });
    expect(poleward('derive', motor, '--out', folder)).toEqual({
      status: 2,
      stdout: '',
      stderr: `poleward: not-writable: ${folder}: that is a folder. Name a file in it.\n`,
    });
  });
});
