/** Laws of judging over tolerances: what is monotone has its worst case at a corner, and the sample never finds a worse one. */

import fc from 'fast-check';
import { expect, test } from 'vitest';
import { judgePoint, tolerancePlan, worstCases } from '../../../src/analysis/tolerances/index.ts';
import type { Diagram } from '../../../src/diagram/index.ts';
import { draw, input, output, quotient } from '../../arbitraries/draw.ts';

/** 1 / (s² + 2 ζ ω₀ s + ω₀²): the damping ratio of its poles is ζ, whatever ω₀. */
function second(zeta: number, percent: number): Diagram {
  const drawing = draw(
    [input('r'), quotient('plant', 'w^2', 's^2 + 2*z*w*s + w^2'), output('y')],
    ['r -> plant', 'plant -> y'],
  );
  return {
    ...drawing,
    parameters: [
      { name: 'w', value: '3', tolerance: '20 %' },
      { name: 'z', value: String(zeta), tolerance: `${percent} %` },
    ],
    requirements: [
      { kind: 'damping', least: '0.5' },
      { kind: 'overshoot', input: 'r', output: 'y', most: '20' },
    ],
  };
}

test('damping and overshoot are worst at a corner of least damping', () => {
  fc.assert(
    fc.property(fc.integer({ min: 15, max: 60 }), fc.integer({ min: 1, max: 40 }), (hundredths, percent) => {
      const zeta = hundredths / 100;
      const diagram = second(zeta, percent);
      const plan = tolerancePlan(diagram, { samples: 20, seed: hundredths });
      if (!plan.ok) throw new Error('the plan was refused');
      const { parameters, points } = plan.value;
      const judged = points.map(point => judgePoint(diagram, parameters, point, null));
      const [damping, overshoot] = worstCases(2, judged);
      const least = zeta * (1 - percent / 100);
      expect(points[damping?.point ?? 0]).toMatchObject({ kind: 'corner' });
      expect(damping?.assessment.value).toBeCloseTo(least, 9);
      // exp(−π ζ / √(1 − ζ²))
      const expected = 100 * Math.exp((-Math.PI * least) / Math.sqrt(1 - least ** 2));
      expect(overshoot?.assessment.value).toBeCloseTo(expected, 6);
    }),
    { seed: 20261201, numRuns: 15 },
  );
});
