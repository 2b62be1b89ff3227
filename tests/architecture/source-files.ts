/** The project's own source files, read once for the tests of the architecture. */

import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { SourceFile } from './imports.ts';

const root = fileURLToPath(new URL('../../', import.meta.url));

/** Every TypeScript file of src, by path from the project's root. */
export function sourceFiles(): SourceFile[] {
  return readdirSync(`${root}/src`, { recursive: true, encoding: 'utf8' })
    .filter(name => /\.tsx?$/.test(name))
    .sort()
    .map(name => ({ path: `src/${name.replaceAll('\\', '/')}`, text: readFileSync(`${root}/src/${name}`, 'utf8') }));
}

/** Text of a file of the project, by path from its root. */
export function projectFile(path: string): string {
  return readFileSync(`${root}/${path}`, 'utf8');
}
