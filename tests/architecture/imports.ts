/**
 * Reads the imports of a source file and judges them by the table of rooms. Pure: file texts in, complaints out, so that the
 * judge itself can be shown wrong imports.
 */

import { posix } from 'node:path';
import { LIBRARY_ROOMS, MAY_IMPORT } from './rooms.ts';

/** A file by its path from the project's root (`src/share/link.ts`) and its text. */
export interface SourceFile {
  readonly path: string;
  readonly text: string;
}

const IMPORTS = [
  /\b(?:import|export)\b[^;'"`]*?\bfrom\s*['"]([^'"]+)['"]/g,
  /\bimport\s*['"]([^'"]+)['"]/g,
  /\bimport\(\s*['"`]([^'"`]+)['"`]\s*\)/g,
  /\bnew URL\(\s*['"`](\.[^'"`]+)['"`],\s*import\.meta\.url/g,
];

/** What a text imports, in whatever way, as it is written there. */
export function importsIn(text: string): string[] {
  const code = text.replace(/\/\*[\s\S]*?\*\//g, '').replace(/^\s*\/\/.*$/gm, '');
  return IMPORTS.flatMap(pattern => [...code.matchAll(pattern)].map(([, specifier]) => specifier ?? ''));
}

function roomOf(path: string): string {
  return path.split('/')[1] ?? '';
}

/** `react-dom/client` → `react-dom`, `@fontsource/b612` → `@fontsource`, `node:fs` → `node`. */
function libraryOf(specifier: string): string {
  return specifier.split(/[/:]/)[0] ?? '';
}

/** Folders that `target` lies in and `from` does not, outermost first. */
function foldersEntered(from: string, target: string): string[] {
  const parts = posix.dirname(target).split('/');
  const folders = parts.map((_, depth) => parts.slice(0, depth + 1).join('/'));
  return folders.filter(folder => !`${from}`.startsWith(`${folder}/`));
}

/** One complaint for each import that the order of the rooms does not allow. */
export function complaintsAbout(files: readonly SourceFile[]): string[] {
  const indexes = new Set(files.map(({ path }) => path).filter(path => posix.basename(path) === 'index.ts'));
  return files.flatMap(file =>
    importsIn(file.text).flatMap(specifier => {
      const complaint = specifier.startsWith('.')
        ? complaintAboutFile(file.path, specifier, indexes)
        : complaintAboutLibrary(file.path, specifier);
      return complaint === null ? [] : [`${file.path} imports ${specifier}: ${complaint}`];
    }),
  );
}

function complaintAboutLibrary(from: string, specifier: string): string | null {
  const rooms = LIBRARY_ROOMS[libraryOf(specifier)];
  if (rooms === undefined) return 'the library is not in the table of rooms';
  return rooms.includes(roomOf(from)) ? null : `only ${rooms.join(', ')} may`;
}

function complaintAboutFile(from: string, specifier: string, indexes: ReadonlySet<string>): string | null {
  const target = posix.join(posix.dirname(from), specifier.split('?')[0] ?? '');
  // The command line names its version, which stands in package.json alone.
  if (target === 'package.json') return roomOf(from) === 'cli' ? null : 'only cli may';
  const [here, there] = [roomOf(from), roomOf(target)];
  if (here !== there && !(MAY_IMPORT[here] ?? []).includes(there)) return `${here} may not import ${there}`;
  // A worker is not imported but started, by the file that it is.
  if (here !== there && posix.basename(target) === 'worker.ts') return null;
  // A folder inside a room has an index of its own where it is a concept of its own; either index will do.
  const entered = foldersEntered(from, target).filter(folder => here !== there || indexes.has(`${folder}/index.ts`));
  if (entered.length === 0 || entered.some(folder => target === `${folder}/index.ts`)) return null;
  return `other folders import ${entered[0]} only through its index`;
}
