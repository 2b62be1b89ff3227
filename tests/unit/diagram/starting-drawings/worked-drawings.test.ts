import { describe, expect, test } from 'vitest';
import { poles, stability } from '../../../../src/analysis/index.ts';
import { compile } from '../../../../src/compile/index.ts';
import { modelFile } from '../../../../src/deliver/index.ts';
import { blockRectangle, sheetGeometry } from '../../../../src/diagram/geometry/index.ts';
import { checkExpressions, readDiagram, workedDrawings, writeDiagram } from '../../../../src/diagram/index.ts';
import { routeWires } from '../../../../src/diagram/routing/index.ts';
import { valueOf } from '../../results.ts';

const ALL = workedDrawings();

function worked(trade: string) {
  const found = ALL.find(each => each.trade === trade);
  if (found === undefined) throw new Error(`no drawing from the trade ${trade}`);
  return modelFile({ diagram: found.diagram, derivation: valueOf(compile(found.diagram)) });
}

/** The exact entry of A in the row of one state and the column of another. */
function entry(model: ReturnType<typeof worked>, row: string, column: string): string | undefined {
  return model.exact?.A[model.states.indexOf(row)]?.[model.states.indexOf(column)];
}

test('six worked drawings come from six trades', () => {
  expect(new Set(ALL.map(({ trade }) => trade)).size).toBe(6);
});

for (const { trade, diagram } of ALL) {
  describe(`the worked drawing from the trade ${trade}`, () => {
    test('is read as it was written, with every expression in order', () => {
      expect(valueOf(readDiagram(writeDiagram(diagram)))).toEqual(diagram);
      expect(checkExpressions(diagram)).toEqual([]);
    });

    test('derives without a warning to a stable model', () => {
      const { model, warnings } = valueOf(compile(diagram));
      expect(warnings).toEqual([]);
      expect(stability(model)).toMatchObject({ verdict: 'stable', proved: true });
    });

    test('stands on the grid without an overlap, every wire with a way of its own', () => {
      const geometry = sheetGeometry(diagram);
      const frames = diagram.blocks.map(block => {
        const placed = geometry.get(block.id);
        if (placed === undefined) throw new Error(`${block.id} has no place`);
        return blockRectangle(block, placed);
      });
      frames.forEach((a, i) => {
        const over = frames
          .slice(i + 1)
          .filter(b => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom);
        expect(over).toEqual([]);
      });
      for (const { at } of diagram.blocks) expect(at?.map(place => place % 20)).toEqual([0, 0]);
      expect(routeWires(diagram).wires.filter(({ forced }) => forced)).toEqual([]);
    });
  });
}

/**
 * By hand, A_t ḣ = K_h (h_r − h) + (K_h/T_h) x − a h with A_t = 1/2, K_h = 1/100, a = 1/500, T_h = 200: ḣ has −0.012/0.5 =
 * −3/125 of h; s² + 0.024 s + 0.0001 has the roots −0.012 ± √(0.000044). The thermometer passes its input on at once (the
 * Padé approximant of order 2 is 1 at infinity): τ θ̇ = −θ − k_p K_c θ gives −(1 + 4)/400.
 */
test('the tank has the entries and the level poles of a hand calculation', () => {
  const model = worked('process');
  expect(entry(model, 'h', 'h')).toBe('-3/125');
  expect(entry(model, 'theta', 'theta')).toBe('-1/80');
  for (const root of [-0.012 + Math.sqrt(0.000044), -0.012 - Math.sqrt(0.000044)]) {
    expect(Math.min(...(model.poles ?? []).map(({ re, im }) => Math.hypot(re - root, im)))).toBeLessThan(1e-12);
  }
});

/** By hand: c_s/m_s = 1000/320 = 25/8, k_s/m_s = 225/4, k_t/m_u = 5000, c_b/τ² does not enter v̇_s, the force does as −1/m_s. */
test('the quarter car has the entries of a hand calculation', () => {
  const model = worked('vehicle');
  expect(entry(model, 'v_s', 'v_s')).toBe('-25/8');
  expect(entry(model, 'v_s', 'z')).toBe('-225/4');
  expect(entry(model, 'v_u', 'y')).toBe('-5000');
  expect(entry(model, 'v_u', 'v_u')).toBe('-25');
});

/** By hand: (R_c + V_s K_c)/H = 3.02/47e-6 = 3020000/47, 1/C_o = 50000/11, 1/(R_o C_o) = 25000/11. */
test('the converter has the entries of a hand calculation', () => {
  const model = worked('power electronics');
  expect(entry(model, 'i', 'i')).toBe('-3020000/47');
  expect(entry(model, 'v', 'i')).toBe('50000/11');
  expect(entry(model, 'v', 'v')).toBe('-25000/11');
});

/** By hand: c/J = 75, k/J = 140000; the sum of the poles is the trace: −75 − 2600 − 1.4·5100 − 2·0.005·5000. */
test('the mirror has the entries and the trace of a hand calculation', () => {
  const model = worked('precision motion');
  expect(entry(model, 'rate', 'rate')).toBe('-75');
  expect(entry(model, 'rate', 'theta')).toBe('-140000');
  expect((model.poles ?? []).reduce((sum, { re }) => sum + re, 0)).toBeCloseTo(-(75 + 2600 + 7140 + 50), 6);
});

/**
 * By hand: 1/T = 1/50, K/T = 1/1000, K_d/τ = 10, K_p/τ = 12/25. The characteristic polynomial is
 * s⁴ + 0.42 s³ + 0.018 s² + 0.00048 s + 0.0000016 (K K_i/(τ T)); the product of the poles is its last coefficient.
 */
test('the autopilot has the entries and the product of poles of a hand calculation', () => {
  const diagram = ALL.find(({ trade }) => trade === 'marine')?.diagram;
  if (diagram === undefined) throw new Error('no drawing from the sea');
  const model = worked('marine');
  expect(entry(model, 'rate', 'rate')).toBe('-1/50');
  expect(entry(model, 'rate', 'delta')).toBe('1/1000');
  expect(entry(model, 'delta', 'rate')).toBe('-10');
  expect(entry(model, 'delta', 'psi')).toBe('-12/25');
  const found = poles(valueOf(compile(diagram)).model);
  const list = found.route === 'not-converged' ? [] : found.poles;
  const product = list.reduce((sum, { re, im }) => sum * Math.hypot(re, im), 1);
  expect(product).toBeCloseTo(0.0000016, 15);
});
