/** Every function that a room hands to the others says what it does. */

import { posix } from 'node:path';
import { describe, expect, test } from 'vitest';
import type { SourceFile } from './imports.ts';
import { PORTABLE_ROOMS } from './rooms.ts';
import { sourceFiles } from './source-files.ts';

/** Names an index hands on, with the file each comes from, followed through the indexes of folders within the room. */
function handedOn(index: SourceFile, files: ReadonlyMap<string, string>): { name: string; path: string }[] {
  const lists = index.text.matchAll(/export\s*\{([^}]*)\}\s*from\s*['"](\.[^'"]+)['"]/g);
  return [...lists].flatMap(([, list = '', specifier = '']) => {
    const path = posix.join(posix.dirname(index.path), specifier);
    const names = list.split(',').map(item => item.trim().split(/\s+as\s+/)[0] ?? '');
    const functions = names.filter(name => name !== '' && !name.startsWith('type '));
    if (posix.basename(path) !== 'index.ts') return functions.map(name => ({ name, path }));
    const inner = handedOn({ path, text: files.get(path) ?? '' }, files);
    return inner.filter(({ name }) => functions.includes(name));
  });
}

/** Whether `text` defines `name` as a function, and if so whether a doc comment ends right before it. */
function commentOf(name: string, text: string): 'commented' | 'bare' | 'no function' {
  const asFunction = new RegExp(`^export (?:async )?function\\*? ${name}\\b`, 'm');
  const asConstant = new RegExp(
    `^export const ${name}(?::[^=]+)? = (?:async )?(?:<[^>]*>)?(?:\\([^)]*\\)|\\w+)(?::[^=]+)? =>`,
    'm',
  );
  const at = asFunction.exec(text)?.index ?? asConstant.exec(text)?.index;
  if (at === undefined) return 'no function';
  return /\*\/\s*$/.test(text.slice(0, at)) ? 'commented' : 'bare';
}

/** `path: name` of each function without a comment. */
function bareFunctions(files: readonly SourceFile[]): string[] {
  const texts = new Map(files.map(({ path, text }) => [path, text]));
  return files
    .filter(({ path }) => PORTABLE_ROOMS.some(room => path === `src/${room}/index.ts`))
    .flatMap(index => handedOn(index, texts))
    .filter(({ name, path }) => commentOf(name, texts.get(path) ?? '') === 'bare')
    .map(({ name, path }) => `${path}: ${name}`);
}

describe('every function that a room hands on', () => {
  const files = sourceFiles();

  test('has a doc comment', () => {
    expect(bareFunctions(files)).toEqual([]);
  });

  test('is found: the count is that of the rational arithmetic at the least', () => {
    const texts = new Map(files.map(({ path, text }) => [path, text]));
    const algebra = { path: 'src/algebra/index.ts', text: texts.get('src/algebra/index.ts') ?? '' };
    const names = handedOn(algebra, texts).map(({ name }) => name);
    expect(names).toEqual(expect.arrayContaining(['addRationals', 'subtractRationals', 'multiplyRationals', 'toRows']));
  });

  test('is missed where its comment is gone', () => {
    const index = {
      path: 'src/share/index.ts',
      text: "export { a, b } from './c.ts';\nexport { d } from './e/index.ts';",
    };
    const c = {
      path: 'src/share/c.ts',
      text: '/** Says. */\nexport function a() {}\n\nexport const b = (x: number) => x;',
    };
    const inner = { path: 'src/share/e/index.ts', text: "export { d } from './d.ts';" };
    const d = { path: 'src/share/e/d.ts', text: 'export async function d() {}' };
    expect(bareFunctions([index, c, inner, d])).toEqual(['src/share/c.ts: b', 'src/share/e/d.ts: d']);
  });
});
