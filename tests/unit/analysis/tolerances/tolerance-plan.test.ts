import { describe, expect, test } from 'vitest';
import { diagramAt, tolerancePlan, valuesAt } from '../../../../src/analysis/tolerances/index.ts';
import { emptyDiagram, type Parameter } from '../../../../src/diagram/index.ts';
import { evaluateParameters } from '../../../../src/expression/index.ts';

const drawing = (...parameters: readonly Parameter[]) => ({ ...emptyDiagram(), parameters });

function planOf(diagram: ReturnType<typeof drawing>, samples = 0) {
  const plan = tolerancePlan(diagram, { samples });
  if (!plan.ok) throw new Error(plan.problems[0]?.message);
  return plan.value;
}

describe('the plan of points', () => {
  test('holds the drawing as it is, every corner, then the sample', () => {
    const plan = planOf(
      drawing({ name: 'a', value: '2', tolerance: '10 %' }, { name: 'b', value: '5', tolerance: '1' }),
    );
    expect(plan.points).toEqual([
      { kind: 'drawn', at: [0, 0] },
      { kind: 'corner', at: [-1, -1] },
      { kind: 'corner', at: [1, -1] },
      { kind: 'corner', at: [-1, 1] },
      { kind: 'corner', at: [1, 1] },
    ]);
    expect(plan.hasEveryCorner).toBe(true);
    expect(plan.parameters.map(({ nominal, amount }) => [nominal, amount])).toEqual([
      [2, 0.2],
      [5, 1],
    ]);
  });

  test('the same seed gives the same sample, another seed another, all of it inside', () => {
    const diagram = drawing({ name: 'a', value: '2', tolerance: '10 %' });
    const sample = (seed: number) => {
      const plan = tolerancePlan(diagram, { samples: 50, seed });
      return plan.ok ? plan.value.points.filter(({ kind }) => kind === 'sample').map(({ at }) => at[0] ?? 2) : [];
    };
    expect(sample(7)).toEqual(sample(7));
    expect(sample(7)).not.toEqual(sample(8));
    expect(sample(7)).toHaveLength(50);
    expect(sample(7).every(part => Math.abs(part) <= 1)).toBe(true);
    expect(Math.min(...sample(7))).toBeLessThan(-0.8);
    expect(Math.max(...sample(7))).toBeGreaterThan(0.8);
  });

  test('of ten parameters every corner is visited, of eleven as many random ones', () => {
    const many = (count: number) =>
      drawing(...Array.from({ length: count }, (_, k) => ({ name: `p${k}`, value: '1', tolerance: '1 %' })));
    expect(planOf(many(10))).toMatchObject({ hasEveryCorner: true });
    expect(planOf(many(10)).points).toHaveLength(1 + 1024);
    expect(planOf(many(11))).toMatchObject({ hasEveryCorner: false });
    expect(planOf(many(11)).points).toHaveLength(1 + 1024);
  });

  test('a drawing without tolerances has one point', () => {
    expect(planOf(drawing({ name: 'a', value: '2' }, { name: 'b', value: '2', tolerance: '0' }), 100).points).toEqual([
      { kind: 'drawn', at: [] },
    ]);
  });

  test('a tolerance without a value is refused and named', () => {
    const plan = tolerancePlan(drawing({ name: 'a', value: '2', tolerance: 'x %' }));
    expect(!plan.ok && plan.problems[0]).toMatchObject({
      parameter: 'a',
      message: 'Parameter a, tolerance: x is not a parameter. Add x to the parameters.',
    });
  });
});

describe('the drawing at a point', () => {
  test('has exact values, also of what is derived from a parameter that is moved', () => {
    const diagram = drawing(
      { name: 'a', value: '1/3', tolerance: '10 %' },
      { name: 'b', value: '2*a', tolerance: '0.1' },
      { name: 'c', value: 'a + b' },
    );
    const { parameters } = planOf(diagram);
    const point = { kind: 'sample', at: [0.5, -1] } as const;
    const values = evaluateParameters(diagramAt(diagram, parameters, point).parameters);
    const exact = (name: string) => (values.ok ? values.value.get(name)?.exact : null);
    // a = 1/3 + 1/2 · 1/30 = 7/20, b = 7/10 − 1/10 = 3/5, c = 19/20
    expect(exact('a')).toEqual({ n: 7n, d: 20n });
    expect(exact('b')).toEqual({ n: 3n, d: 5n });
    expect(exact('c')).toEqual({ n: 19n, d: 20n });
    expect(valuesAt(parameters, point)[0]).toBeCloseTo(0.35, 12);
  });

  test('is the drawing itself where nothing is moved', () => {
    const diagram = drawing({ name: 'a', value: '2', tolerance: '10 %' });
    const { parameters } = planOf(diagram);
    expect(diagramAt(diagram, parameters, { kind: 'drawn', at: [0] }).parameters).toEqual(diagram.parameters);
  });
});
