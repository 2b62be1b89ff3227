import { describe, expect, test } from 'vitest';
import { paperSvg } from '../../../../src/deliver/sheet-svg/index.ts';
import { type Block, type Diagram, emptyDiagram, startingDrawing } from '../../../../src/diagram/index.ts';
import { checkWellFormed } from './well-formed.ts';

const column = (count: number, step: readonly [number, number]): Diagram => ({
  ...emptyDiagram('Chain'),
  blocks: Array.from(
    { length: count },
    (_, i): Block => ({ id: `g${i}`, kind: 'gain', gain: '2', at: [i * step[0], i * step[1]] }),
  ),
});

/** Places and units of the groups that stand on the page by themselves: the drawing and the title block. */
function placesOf(svg: string): { x: number; y: number; unit: number }[] {
  return [...svg.matchAll(/^<g transform="translate\((\S+) (\S+)\) scale\((\S+)\)">/gm)].map(([, x, y, unit]) => ({
    x: Number(x),
    y: Number(y),
    unit: Number(unit),
  }));
}

describe('the printed sheet', () => {
  test('is one well-formed A4 page, the same for the same drawing', () => {
    const { svg } = paperSvg(startingDrawing());
    checkWellFormed(svg);
    expect(svg).toContain('viewBox="0 0 297 210" width="297mm" height="210mm"');
    expect(paperSvg(structuredClone(startingDrawing())).svg).toBe(svg);
  });

  test('lies across for a wide drawing and upright for a high one', () => {
    expect(paperSvg(column(12, [160, 0])).orientation).toBe('landscape');
    const upright = paperSvg(column(30, [0, 120]));
    expect(upright.orientation).toBe('portrait');
    expect(upright.svg).toContain('viewBox="0 0 210 297"');
  });

  test('has the fields of the title block with their labels, notes and parameters', () => {
    const { svg } = paperSvg({
      ...startingDrawing(),
      title: 'Winch <4>',
      revision: 'B',
      date: '2026-11-30',
      author: 'design office',
      notes: 'first line\nsecond line',
    });
    for (const label of ['Title', 'Document type', 'Created by', 'Revision', 'Date of issue', 'Notes', 'parameter']) {
      expect(svg).toContain(`>${label}</text>`);
    }
    for (const text of ['Winch &lt;4&gt;', 'B', '2026-11-30', 'design office', 'first line', 'second line']) {
      expect(svg).toContain(`>${text}</text>`);
    }
  });

  test('stands its title block in the lower right corner of the border, 10 mm from the edges, and 180 mm wide', () => {
    const { svg } = paperSvg(column(3, [160, 0]));
    const title = placesOf(svg)[1];
    expect(title?.unit).toBe(0.25);
    expect(title?.x).toBeCloseTo(297 - 10 - 180, 6);
    expect((title?.y ?? 0) + 2 * 44 * 0.25).toBeCloseTo(200, 6);
  });

  test('has every block inside the border and clear of the title block, from one block to a thousand', () => {
    for (const [count, step] of [
      [1, [0, 0]],
      [8, [160, 0]],
      [40, [0, 100]],
      [30, [140, 90]],
      [1000, [120, 4]],
    ] as const) {
      const diagram = column(count, step);
      const { svg, orientation } = paperSvg(diagram);
      const [width, height] = orientation === 'landscape' ? [297, 210] : [210, 297];
      const [drawing, title] = placesOf(svg);
      if (drawing === undefined || title === undefined) throw new Error('a page without its parts');
      expect(drawing.unit).toBeLessThanOrEqual(0.35);
      for (const { at = [0, 0] } of diagram.blocks) {
        const [x, y] = [drawing.x + drawing.unit * at[0], drawing.y + drawing.unit * at[1]];
        expect(x).toBeGreaterThan(20);
        expect(x).toBeLessThan(width - 10);
        expect(y).toBeGreaterThan(10);
        expect(y).toBeLessThan(height - 10);
        expect(x > title.x && y > title.y).toBe(false);
      }
    }
  });

  test('sets a long parameter table smaller, so that it takes half the height at most', () => {
    const parameters = Array.from({ length: 40 }, (_, i) => ({ name: `k_${i}`, value: '1' }));
    const title = placesOf(paperSvg({ ...column(3, [160, 0]), parameters }).svg)[1];
    expect(title?.unit).toBeLessThan(0.25);
    expect(title?.y).toBeGreaterThanOrEqual(95 - 1e-2);
  });

  test('is black on white', () => {
    const { svg, rules } = paperSvg(startingDrawing());
    expect(svg).toContain('<rect fill="#ffffff" width="297" height="210"/>');
    expect(rules).toContain('stroke:#000000');
  });
});
