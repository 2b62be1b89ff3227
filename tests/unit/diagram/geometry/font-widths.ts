/** Advance widths read from a WOFF file: its character map of format 4 and its horizontal metrics (W3C WOFF 1.0, ISO/IEC 14496-22). */

import { readFileSync } from 'node:fs';
import { inflateSync } from 'node:zlib';

function tables(font: Buffer): ReadonlyMap<string, Buffer> {
  const found = new Map<string, Buffer>();
  for (let index = 0; index < font.readUInt16BE(12); index += 1) {
    const entry = 44 + 20 * index;
    const offset = font.readUInt32BE(entry + 4);
    const packed = font.readUInt32BE(entry + 8);
    const length = font.readUInt32BE(entry + 12);
    const bytes = font.subarray(offset, offset + packed);
    found.set(font.toString('latin1', entry, entry + 4), packed < length ? inflateSync(bytes) : bytes);
  }
  return found;
}

function glyphs(map: Buffer): ReadonlyMap<number, number> {
  const found = new Map<number, number>();
  for (let index = 0; index < map.readUInt16BE(2); index += 1) {
    const table = map.readUInt32BE(8 + 8 * index);
    if (map.readUInt16BE(table) !== 4) continue;
    const segments = map.readUInt16BE(table + 6) / 2;
    for (let segment = 0; segment < segments; segment += 1) {
      const at = table + 14 + 2 * segment;
      const start = map.readUInt16BE(at + 2 + 2 * segments);
      const delta = map.readInt16BE(at + 2 + 4 * segments);
      const rangeAt = at + 2 + 6 * segments;
      const range = map.readUInt16BE(rangeAt);
      for (let code = start; code <= map.readUInt16BE(at) && code < 0xffff; code += 1) {
        const listed = range === 0 ? code : map.readUInt16BE(rangeAt + range + 2 * (code - start));
        if (listed !== 0) found.set(code, (listed + delta) & 0xffff);
      }
    }
  }
  return found;
}

/** Widths by character in thousandths of the type size. */
export function fontWidths(path: string): ReadonlyMap<string, number> {
  const font = tables(readFileSync(path));
  const table = (name: string): Buffer => font.get(name) ?? Buffer.alloc(0);
  const unitsPerEm = table('head').readUInt16BE(18);
  const metrics = table('hhea').readUInt16BE(34);
  const widths = new Map<string, number>();
  for (const [code, glyph] of glyphs(table('cmap'))) {
    const advance = table('hmtx').readUInt16BE(4 * Math.min(glyph, metrics - 1));
    widths.set(String.fromCodePoint(code), (1000 * advance) / unitsPerEm);
  }
  return widths;
}
