/**
 * `check` on drawings that require something. The figures are those of the standard second-order loop: overshoot
 * exp(−π ζ / √(1 − ζ²)), which is 16.30 % at ζ = ½ and 25.38 % at ζ = 0.4 (Ogata, Modern Control Engineering, chapter 5; from memory, and
 * recomputed by hand).
 */

import { describe, expect, test } from 'vitest';
import { draw, input, output, quotient, sum } from '../../arbitraries/draw.ts';
import { runOn } from './machine.ts';

/** ω₀² / (s (s + 2 ζ ω₀)) under unit feedback, ω₀ = 2 and ζ = ½ ± 20 %, a cut in the feedback. */
const loop = (...requirements: readonly object[]) => ({
  files: {
    loop: JSON.stringify({
      ...draw(
        [input('r'), sum('e', '+-'), quotient('plant', 'w^2', 's^2 + 2*z*w*s'), output('y')],
        ['r -> e', 'e -> plant', 'plant -> y', 'plant -> e:1'],
      ),
      parameters: [
        { name: 'w', value: '2' },
        { name: 'z', value: '0.5', tolerance: '20 %' },
      ],
      cuts: [{ to: ['e', 1] }],
      requirements,
    }),
  },
});
const channel = { input: 'r', output: 'y' };

describe('check', () => {
  test('says of each requirement by how much it is met, and ends with 0', async () => {
    const outcome = await runOn(
      loop({ kind: 'stable' }, { kind: 'overshoot', ...channel, most: '20' }, { kind: 'damping', least: 'z' }),
      'check',
      'loop',
    );
    expect(outcome).toMatchObject({ status: 0, complaints: [] });
    expect(outcome.printed).toBe(
      'poleward: requirement-met: stability: It is stable.\n' +
        'poleward: requirement-met: overshoot from r to y at most 20 %: 16.3 %, inside by 3.697 %.\n' +
        'poleward: requirement-met: damping ratio of every pole at least z: 0.5, inside by 0.\n',
    );
  });

  test('ends with 4 where one is missed, and says by how much', async () => {
    const outcome = await runOn(loop({ kind: 'overshoot', ...channel, most: '16' }), 'check', 'loop');
    expect(outcome).toMatchObject({ status: 4, complaints: [] });
    expect(outcome.printed).toBe(
      'poleward: requirement-missed: overshoot from r to y at most 16 %: 16.3 %, outside by 0.3034 %.\n',
    );
  });

  test('ends with 4 where one cannot be checked, and says why', async () => {
    const outcome = await runOn(loop({ kind: 'phase-margin', cut: 'valve', least: '45' }), 'check', 'loop');
    expect(outcome).toMatchObject({ status: 4, complaints: [] });
    expect(outcome.printed).toBe(
      'poleward: requirement-unchecked: phase margin at valve at least 45°: There is no cut valve in the drawing.\n',
    );
  });

  test('judges over the tolerance where the requirement asks for it, and names the worst values', async () => {
    const outcome = await runOn(
      loop({ kind: 'overshoot', ...channel, most: '20', tolerances: true }, { kind: 'damping', least: '0.45' }),
      'check',
      'loop',
      '--samples',
      '10',
    );
    expect(outcome.status).toBe(4);
    expect(String(outcome.printed).split('\n')).toEqual([
      expect.stringMatching(
        /^poleward: requirement-missed: overshoot from r to y at most 20 % for the whole tolerance: 25\.38 %, outside by 5\.383 %\. Missed at \d+ of 13 points with every corner; worst at z = 0\.4\.$/,
      ),
      'poleward: requirement-met: damping ratio of every pole at least 0.45: 0.5, inside by 0.05.',
      '',
    ]);
  });

  test('judges all of them so with --tolerances, and says that points do not prove', async () => {
    const outcome = await runOn(loop({ kind: 'damping', least: '0.3' }), 'check', 'loop', '--tolerances');
    expect(outcome).toMatchObject({
      status: 0,
      printed:
        'poleward: requirement-met: damping ratio of every pole at least 0.3 for the whole tolerance: 0.4, inside by 0.1. ' +
        'Not refuted by 203 points with every corner; worst at z = 0.4.\n',
    });
  });

  test('a drawing that requires nothing prints nothing', async () => {
    expect(await runOn(loop(), 'check', 'loop', '--tolerances')).toMatchObject({ status: 0, printed: '' });
  });
});
