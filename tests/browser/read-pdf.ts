/**
 * As much of a PDF file as the tests ask for: its pages, their size and the text on them (ISO 32000-1: 7.3.8 streams, 9.4.3
 * showing text, 9.10.3 ToUnicode; the numbers from memory). For files whose objects stand in the open, as Chromium writes them.
 */

import { inflateSync } from 'node:zlib';

interface PdfObject {
  readonly head: string;
  /** Unpacked; empty where the object has none. */
  readonly stream: string;
}

export interface ReadPdf {
  readonly pages: number;
  /** Of the first page, points. */
  readonly width: number;
  readonly height: number;
  /** One entry for each piece that is shown in one go. */
  readonly texts: readonly string[];
}

export function readPdf(file: Buffer): ReadPdf {
  const objects = objectsOf(file);
  const pages = [...objects.values()].filter(({ head }) => /\/Type \/Page\b(?!s)/.test(head));
  const head = pages[0]?.head ?? '';
  const [, , width = 0, height = 0] = /\/MediaBox \[([^\]]*)\]/.exec(head)?.[1]?.trim().split(/\s+/).map(Number) ?? [];
  const content = objects.get(Number(/\/Contents (\d+)/.exec(head)?.[1]))?.stream ?? '';
  return { pages: pages.length, width, height, texts: textsOf(content, fontsOf(head, objects)) };
}

function objectsOf(file: Buffer): ReadonlyMap<number, PdfObject> {
  const text = file.toString('latin1');
  const objects = new Map<number, PdfObject>();
  for (const match of text.matchAll(/(\d+) 0 obj\s([\s\S]*?)(stream\r?\n|endobj)/g)) {
    const [whole, number, head = '', end] = match;
    const start = match.index + whole.length;
    const stream =
      end === 'endobj' ? '' : inflateSync(file.subarray(start, file.indexOf('endstream', start))).toString('latin1');
    objects.set(Number(number), { head: head.replaceAll(/\s+/g, ' '), stream });
  }
  return objects;
}

/** From a font's name on the page to its characters by glyph, both as hexadecimal digits. */
function fontsOf(
  page: string,
  objects: ReadonlyMap<number, PdfObject>,
): ReadonlyMap<string, ReadonlyMap<number, string>> {
  const names = /\/Font <<([^>]*)>>/.exec(page)?.[1] ?? '';
  const fonts = [...names.matchAll(/\/(\w+) (\d+) 0 R/g)].map(([, name = '', number]) => {
    const font = objects.get(Number(number))?.head ?? '';
    return [name, charactersOf(objects.get(Number(/\/ToUnicode (\d+)/.exec(font)?.[1]))?.stream ?? '')] as const;
  });
  return new Map(fonts);
}

function charactersOf(map: string): ReadonlyMap<number, string> {
  const characters = new Map<number, string>();
  const hex = (digits = '') => Number.parseInt(digits, 16);
  for (const [, part = ''] of map.matchAll(/beginbfchar([\s\S]*?)endbfchar/g)) {
    for (const [, glyph, code] of part.matchAll(/<(\w+)> <(\w+)>/g)) {
      characters.set(hex(glyph), String.fromCharCode(hex(code)));
    }
  }
  for (const [, part = ''] of map.matchAll(/beginbfrange([\s\S]*?)endbfrange/g)) {
    for (const [, from, to, code] of part.matchAll(/<(\w+)> <(\w+)> <(\w+)>/g)) {
      for (let glyph = hex(from); glyph <= hex(to); glyph += 1) {
        characters.set(glyph, String.fromCharCode(hex(code) + glyph - hex(from)));
      }
    }
  }
  return characters;
}

function textsOf(content: string, fonts: ReadonlyMap<string, ReadonlyMap<number, string>>): readonly string[] {
  return [...content.matchAll(/BT([\s\S]*?)ET/g)].map(([, part = '']) => {
    const characters = fonts.get(/\/(\w+) \S+ Tf/.exec(part)?.[1] ?? '');
    const glyphs = [...part.matchAll(/<(\w+)>/g)].flatMap(([, digits = '']) => digits.match(/.{4}/g) ?? []);
    return glyphs.map(glyph => characters?.get(Number.parseInt(glyph, 16)) ?? '?').join('');
  });
}
