import { describe, expect, test } from 'vitest';
import { type Annotation, emptyDiagram } from '../../../../src/diagram/index.ts';
import { annotationSentence, countedThings, shortTitle } from '../../../../src/ui/annotations/annotation-texts.ts';
import { findAnnotations } from '../../../../src/ui/annotations/find-annotations.ts';
import { readQuoted } from '../../../../src/ui/write-line/read-quoted.ts';

const FRAME: Annotation = { id: 'f', kind: 'frame', at: [0, 0], size: [200, 100], text: 'Speed loop' };
const TEXT: Annotation = { id: 't', kind: 'text', at: [300, 60], size: [60, 20], text: 'the loop\nat speed.' };
const sheet = { ...emptyDiagram(), annotations: [FRAME, TEXT] };

describe('annotations', () => {
  test('are found by what is written in them, capitals or not and across lines', () => {
    expect(findAnnotations(sheet, 'SPEED')).toEqual([FRAME, TEXT]);
    expect(findAnnotations(sheet, 'loop at')).toEqual([TEXT]);
    expect(findAnnotations(sheet, '  ')).toEqual([]);
  });

  test('are said by kind and text, a frame with what it stands around', () => {
    expect(annotationSentence(TEXT, sheet)).toBe('text the loop at speed.');
    expect(annotationSentence(FRAME, sheet)).toBe('frame Speed loop, around no block');
    const blocks = [{ id: 'x', kind: 'integrator', at: [100, 50] } as const];
    expect(annotationSentence(FRAME, { ...sheet, blocks })).toBe('frame Speed loop, around integrator x');
    expect(shortTitle(TEXT)).toBe('text the loop at speed');
    expect(shortTitle({ kind: 'text', text: 'x'.repeat(80) })).toBe(`text ${'x'.repeat(35)}…`);
    expect([countedThings(1, 0), countedThings(0, 2), countedThings(3, 1)]).toEqual([
      '1 block',
      '2 annotations',
      '3 blocks and 1 annotation',
    ]);
  });
});

describe('a text in quotes', () => {
  test('is what stands between them, the last one left out or not', () => {
    expect(readQuoted('"speed in rad/s"')).toBe('speed in rad/s');
    expect(readQuoted('  “as typed')).toBe('as typed');
    expect(readQuoted('"say "so" here"')).toBe('say "so" here');
  });

  test('needs a quote to begin with and a word', () => {
    expect(readQuoted('K_p')).toBeNull();
    expect(readQuoted('"')).toBeNull();
    expect(readQuoted('"  "')).toBeNull();
  });
});
