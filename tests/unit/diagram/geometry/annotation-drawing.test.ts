import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  annotationArea,
  annotationDrawing,
  type TextShape,
  textHeight,
  textWidth,
} from '../../../../src/diagram/geometry/index.ts';
import type { Annotation } from '../../../../src/diagram/index.ts';
import { SEED } from '../../../arbitraries/rationals.ts';

const note = (text: string, width: number): Annotation => ({
  id: 'n',
  kind: 'text',
  at: [100, 40],
  size: [width, 20],
  text,
});

const linesOf = (annotation: Annotation): readonly TextShape[] =>
  annotationDrawing(annotation).flatMap(shape => (shape.kind === 'text' ? [shape] : []));

const plainText = ({ spans }: TextShape): string => spans.map(({ text }) => text).join('');

describe('a text on the sheet', () => {
  test('is broken between words where a line is full, and where it is broken itself', () => {
    const text = 'the inner loop sees the whole dead time\n\nmeasured';
    const lines = linesOf(note(text, 120));
    expect(lines.map(plainText).join(' ')).toBe(text.replace('\n\n', '  '));
    expect(lines.length).toBeGreaterThan(3);
    expect(lines.map(({ y }) => y)).toEqual(lines.map((_, line) => 20 * line + 15));
  });

  test('keeps every line within its width and loses no character', () => {
    const word = fc.stringMatching(/^[a-zA-Z0-9,.]{1,30}$/);
    fc.assert(
      fc.property(fc.array(word, { maxLength: 30 }), fc.integer({ min: 20, max: 400 }), (words, width) => {
        const lines = linesOf(note(words.join(' '), width));
        for (const { spans, size, face } of lines) {
          const fits = textWidth(spans, size, face) <= width;
          expect(fits || plainText({ spans } as TextShape).length === 1).toBe(true);
        }
        expect(lines.map(plainText).join('').replaceAll(' ', '')).toBe(words.join(''));
        expect(textHeight(words.join(' '), width)).toBe(20 * Math.max(1, lines.length));
      }),
      { seed: SEED, numRuns: 300 },
    );
  });

  test('sets names with a lowered part, and arithmetic between backquotes, as blocks do', () => {
    const [line] = linesOf(note('K_p is `omega^2/J` here', 400));
    expect(line?.spans[0]).toEqual({ text: 'K', italic: true, script: 'normal' });
    expect(line?.spans[1]).toEqual({ text: 'p', italic: false, script: 'sub' });
    expect(line?.spans).toContainEqual({ text: '2', italic: false, script: 'sup' });
    expect(line === undefined ? '' : plainText(line)).toMatch(/^Kp is ω2.J here$/);
  });

  test('takes the height that its lines need, and its own where that is more', () => {
    expect(annotationArea(note('one', 200))).toEqual({ left: 100, top: 40, right: 300, bottom: 60 });
    expect(annotationArea(note('one\ntwo\nthree', 200)).bottom).toBe(100);
    expect(annotationArea({ ...note('one', 200), size: [200, 90] }).bottom).toBe(130);
  });
});

describe('a frame', () => {
  const frame: Annotation = { id: 'f', kind: 'frame', at: [0, 0], size: [100, 60], text: 'the current controller' };

  test('is a closed line with its title inside the upper edge, cut to its width', () => {
    const [line, title] = annotationDrawing(frame);
    expect(line).toMatchObject({ kind: 'line', ink: 'thin' });
    expect(line?.kind === 'line' ? [line.points[0], line.points.at(-1), line.points[2]] : []).toEqual([
      [0, 0],
      [0, 0],
      [100, 60],
    ]);
    expect(title?.kind === 'text' ? plainText(title) : '').toMatch(/^the current.*…$/);
    expect(title?.kind === 'text' ? textWidth(title.spans, title.size, 'math') : 999).toBeLessThanOrEqual(84);
  });

  test('takes no more than its size', () => {
    expect(annotationArea(frame)).toEqual({ left: 0, top: 0, right: 100, bottom: 60 });
  });
});
