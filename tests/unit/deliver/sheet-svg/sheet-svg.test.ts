import { describe, expect, test } from 'vitest';
import { sheetSvg } from '../../../../src/deliver/sheet-svg/index.ts';
import { type Diagram, emptyDiagram, startingDrawing } from '../../../../src/diagram/index.ts';
import { checkWellFormed } from './well-formed.ts';

const small: Diagram = {
  ...emptyDiagram(),
  title: 'Lag',
  parameters: [{ name: 'tau', value: '0.5', unit: 'kg*m^2', note: 'measured' }],
  blocks: [
    { id: 'u', kind: 'input', at: [60, 60] },
    { id: 'k', kind: 'gain', gain: '1/tau', at: [180, 60] },
    { id: 'y', kind: 'output', at: [300, 60] },
  ],
  wires: [
    { from: ['u', 0], to: ['k', 0] },
    { from: ['k', 0], to: ['y', 0], name: 'v_1' },
  ],
};

describe('the SVG of a sheet', () => {
  test('is well-formed for the starting drawing, in every theme', () => {
    for (const theme of ['light', 'dark', 'print'] as const) {
      checkWellFormed(sheetSvg(startingDrawing(), { theme, grid: true }));
    }
  });

  test('stays well-formed whatever stands in title, names and notes', () => {
    const rough = '</text><script>&"\'\u0000\u0008\ud800]]>';
    const parameters = [{ name: 'tau', value: '0.5', unit: rough, note: rough }];
    const blocks = small.blocks.map(block => ({ ...block, name: rough }));
    const svg = sheetSvg({ ...small, title: rough, parameters, blocks });
    checkWellFormed(svg);
    expect(svg).not.toContain('<script');
    // biome-ignore lint/suspicious/noControlCharactersInRegex: these are what XML forbids
    expect(svg).not.toMatch(/[\u0000-\u0008\ud800-\udfff]/);
  });

  test('refers to nothing outside itself', () => {
    const svg = sheetSvg(startingDrawing(), { grid: true }).replace('xmlns="http://www.w3.org/2000/svg"', '');
    expect(svg).not.toMatch(/https?:|href|url\(|@import|<image/);
  });

  test('is the same for the same diagram', () => {
    expect(sheetSvg(startingDrawing())).toBe(sheetSvg(structuredClone(startingDrawing())));
  });

  test('shows names in mathematics, wires named, values under symbols where they are given', () => {
    const svg = sheetSvg(small, { values: new Map([['k', '2']]) });
    expect(svg).toContain('>τ</tspan>');
    expect(svg).toMatch(/class="figures soft"[^>]*>2<\/text>/);
    expect(svg).toMatch(/>v<\/tspan><tspan[^>]*>1<\/tspan>/);
    expect(sheetSvg(small)).not.toMatch(/class="figures soft"[^>]*>2<\/text>/);
  });

  test('has the parameter table with units as they are written on paper', () => {
    const svg = sheetSvg(small);
    expect(svg).toContain('>kg·m²</text>');
    expect(svg).toContain('>measured</text>');
    expect(sheetSvg(small, { titleBlock: false })).not.toContain('measured');
  });

  test('draws a selection only, with the wires inside it', () => {
    const wiresOf = (svg: string): number => svg.match(/class="solid"/g)?.length ?? 0;
    const all = sheetSvg(small, { titleBlock: false });
    const part = sheetSvg(small, { titleBlock: false, selection: new Set(['u', 'k']) });
    expect(wiresOf(all)).toBe(2);
    expect(wiresOf(part)).toBe(1);
    expect(part).not.toContain('>y</text>');
  });

  test('has squared paper on request only', () => {
    expect(sheetSvg(small, { grid: true })).toContain('class="squares"');
    expect(sheetSvg(small)).not.toContain('class="squares"');
  });

  test('of an empty sheet is a sheet of paper', () => {
    const svg = sheetSvg(emptyDiagram(), { titleBlock: false });
    checkWellFormed(svg);
    expect(svg).toContain('viewBox="-40 -40 480 280"');
  });

  test('covers no block with the title block', () => {
    const svg = sheetSvg(small);
    const corner = /translate\((-?[\d.]+) (-?[\d.]+)\)"><rect class="ink paper line" x="0" y="0"/.exec(svg);
    expect(Number(corner?.[2])).toBeGreaterThanOrEqual(100);
  });
});

describe('annotations in the SVG of a sheet', () => {
  const noted: Diagram = {
    ...small,
    annotations: [
      { id: 'f', kind: 'frame', at: [120, 0], size: [120, 120], text: 'plant & <drive>' },
      { id: 'n', kind: 'text', at: [40, 300], size: [200, 20], text: 'first line\nsecond line' },
    ],
  };

  test('stand behind the wires, each line of a text by itself', () => {
    const svg = sheetSvg(noted);
    checkWellFormed(svg);
    expect(svg).toContain('>plant &amp; &lt;drive&gt;</text>');
    expect(svg).toMatch(/>first line<\/text>.*>second line<\/text>/);
    expect(svg.indexOf('plant')).toBeLessThan(svg.indexOf('class="ink line"'));
  });

  test('lie on the paper whole, beside the title block', () => {
    const [, , top, , height] =
      /viewBox="(\S+) (\S+) (\S+) (\S+)"/.exec(sheetSvg(noted, { titleBlock: false }))?.map(Number) ?? [];
    expect((top ?? 0) + (height ?? 0)).toBeGreaterThanOrEqual(340);
  });

  test('are drawn with a selection where they are chosen', () => {
    const selection = new Set(['k']);
    expect(sheetSvg(noted, { selection })).not.toContain('plant');
    const chosen = sheetSvg(noted, { selection, annotations: new Set(['f']) });
    expect(chosen).toContain('plant');
    expect(chosen).not.toContain('first line');
  });
});
