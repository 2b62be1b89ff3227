/** Links made and read; the packing is checked against zlib, which nobody here wrote. */

import { deflateRawSync, inflateRawSync } from 'node:zlib';
import { describe, expect, test } from 'vitest';
import { minifyDiagram, readDiagram } from '../../../src/diagram/index.ts';
import { decodeLink, encodeLink, isLink } from '../../../src/share/index.ts';
import motor from '../../reference/cases/dc-motor-symbolic.json';

const text = JSON.stringify(motor.diagram);

function drawing() {
  const read = readDiagram(text);
  if (!read.ok) throw new Error('the reference case is a diagram');
  return read.value;
}

/** A link with any bytes in it, by Node's own means. */
const linkOf = (content: string | Buffer) => `#d1=${deflateRawSync(content, { level: 9 }).toString('base64url')}`;

/** Code and message of a refusal; a link that is read is `[]`. */
function refusalOf(link: string): string[] {
  const decoded = decodeLink(link);
  return decoded.ok ? [] : decoded.problems.map(({ code, message }) => `${code}: ${message}`);
}

const DAMAGED = [
  'not-readable: The link is damaged or cut short. Copy the whole address again from where it was sent.',
];
const TOO_LARGE = ['too-large: The link unpacks to more than 4 MiB. Ask for the drawing as a file.'];

describe('a link', () => {
  test('is read back as the drawing it was made of', () => {
    const diagram = drawing();
    expect(decodeLink(encodeLink(diagram))).toEqual({ ok: true, value: diagram });
  });

  test('holds the minified drawing, raw deflated, base64url without padding', () => {
    const link = encodeLink(drawing());
    expect(link).toMatch(/^#d1=[A-Za-z0-9_-]+$/);
    const packed = Buffer.from(link.slice(4), 'base64url');
    expect(inflateRawSync(packed).toString('utf8')).toBe(minifyDiagram(drawing()));
  });

  test('made by other means of the same format is read', () => {
    expect(decodeLink(linkOf(text))).toEqual({ ok: true, value: drawing() });
  });

  test('is the same text each time', () => {
    expect(encodeLink(drawing())).toBe(encodeLink(drawing()));
  });

  test('is read with the address before it, and with the line breaks of a letter', () => {
    const link = encodeLink(drawing());
    const wrapped = link.replace(/.{60}/g, '$&\r\n ');
    for (const whole of [`https://example.org/poleward/${link}`, `file:///poleward.html${link}`, `  ${wrapped}\n`]) {
      expect(decodeLink(whole)).toEqual({ ok: true, value: drawing() });
    }
  });

  test('keeps names in every script', () => {
    const diagram = { ...drawing(), title: 'Сервопривод 伺服 𝜔' };
    expect(decodeLink(encodeLink(diagram))).toEqual({ ok: true, value: diagram });
  });
});

describe('a text is refused as a link', () => {
  test('where there is no fragment of ours in it', () => {
    const message = 'not-readable: This is no share link: it holds no "#d1=". Copy the whole address.';
    for (const other of ['', 'https://example.org/', 'https://example.org/#top', 'd1=abc', '#d=abc']) {
      expect(refusalOf(other)).toEqual([message]);
      expect(isLink(other)).toBe(false);
    }
  });

  test('where it is of another version', () => {
    const message = 'The link is of version 2; only version 1 can be read. Open the address itself in a browser.';
    expect(refusalOf('https://example.org/#d2=abc')).toEqual([`wrong-version: ${message}`]);
    expect(isLink('#d2=abc')).toBe(true);
  });

  test('where it is cut short anywhere', () => {
    const link = encodeLink(drawing());
    for (let length = 4; length < link.length; length += 7) expect(refusalOf(link.slice(0, length))).toEqual(DAMAGED);
    expect(refusalOf(link.slice(0, -1))).toEqual(DAMAGED);
  });

  test('where a character is not of the alphabet, or the bytes are no deflate stream', () => {
    const link = encodeLink(drawing());
    expect(refusalOf(link.replace(/.$/, '!'))).toEqual(DAMAGED);
    expect(refusalOf(`${link}=`)).toEqual(DAMAGED);
    expect(refusalOf('#d1=_____w')).toEqual(DAMAGED);
  });

  test('where what it unpacks to is no UTF-8', () => {
    expect(refusalOf(linkOf(Buffer.from([0x7b, 0xff, 0xfe, 0x7d])))).toEqual(DAMAGED);
  });

  test('where it unpacks to more than 4 MiB, before it has done so', () => {
    const bomb = linkOf(Buffer.alloc(200 * 1024 * 1024));
    expect(bomb.length).toBeLessThan(300_000);
    const before = process.memoryUsage().arrayBuffers;
    expect(refusalOf(bomb)).toEqual(TOO_LARGE);
    expect(process.memoryUsage().arrayBuffers - before).toBeLessThan(50 * 1024 * 1024);
  });

  test('where it is a byte past 4 MiB, and not for its size where it is right at it', () => {
    const limit = 4 * 1024 * 1024;
    const padded = (size: number) => linkOf(text + ' '.repeat(size - text.length));
    expect(refusalOf(padded(limit))).toEqual([]);
    expect(refusalOf(padded(limit + 1))).toEqual(TOO_LARGE);
  });

  test('where it is longer than any that unpacks to 4 MiB', () => {
    expect(refusalOf(`#d1=${'A'.repeat(9 * 1024 * 1024)}`)).toEqual(TOO_LARGE);
  });

  test('where it holds something else than a diagram, with what the reader of diagrams says', () => {
    expect(refusalOf(linkOf('{"format":"poleward-diagram","version":2}')).join()).toMatch(/^wrong-version: /);
    expect(refusalOf(linkOf('[1, 2]')).join()).toMatch(/^not-a-diagram: /);
  });
});
