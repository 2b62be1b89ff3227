/**
 * A quarter of a car on an active suspension: body m_s over wheel m_u, spring and damper between them, the tyre on a road that rises
 * at the rate w. An actuator with the lag tau damps the body against the inertial frame. The car and its figures are invented data.
 */

import type { Diagram } from '../types.ts';
import { wired } from './wired.ts';

/** States body velocity, wheel velocity, suspension and tyre deflection, actuator force; input w; outputs v_s and z. */
export const ACTIVE_SUSPENSION: Diagram = {
  format: 'poleward-diagram',
  version: 1,
  title: 'Quarter car, active suspension',
  revision: '1',
  date: '2026-12-01',
  notes: 'An actuator damps the body of a car over a rough road. Invented data for the demo.',
  parameters: [
    { name: 'm_s', value: '320', unit: 'kg', note: 'body, a quarter' },
    { name: 'm_u', value: '40', unit: 'kg', note: 'wheel and hub' },
    { name: 'k_s', value: '18e3', unit: 'N/m', note: 'spring' },
    { name: 'c_s', value: '1000', unit: 'N*s/m', note: 'damper' },
    { name: 'k_t', value: '200e3', unit: 'N/m', note: 'tyre' },
    { name: 'c_b', value: '1800', unit: 'N*s/m', note: 'damping of the body' },
    { name: 'tau', value: '0.01', unit: 's', note: 'lag of the actuator' },
  ],
  blocks: [
    { id: 'w', kind: 'input', unit: 'm/s', at: [40, 540] },
    { id: 'v_s', kind: 'integrator', unit: 'm/s', at: [220, 120] },
    { id: 'v_u', kind: 'integrator', unit: 'm/s', at: [1040, 440] },
    { id: 'z', kind: 'integrator', unit: 'm', at: [480, 240] },
    { id: 'y', kind: 'integrator', unit: 'm', at: [260, 540] },
    { id: 'body', kind: 'gain', gain: '-1/m_s', at: [120, 120] },
    { id: 'travel', kind: 'summer', signs: '+-', at: [340, 240] },
    { id: 'spring', kind: 'gain', gain: 'k_s', at: [600, 240] },
    { id: 'damper', kind: 'gain', gain: 'c_s', at: [540, 340] },
    { id: 'actuator', kind: 'transfer-function', numerator: 'c_b', denominator: 'tau*s + 1', at: [540, 120] },
    { id: 'force', kind: 'summer', signs: '+++', at: [740, 240] },
    { id: 'wheel', kind: 'summer', signs: '+-', at: [820, 440] },
    { id: 'hub', kind: 'gain', gain: '1/m_u', at: [920, 440] },
    { id: 'tyre', kind: 'summer', signs: '+-', at: [140, 540] },
    { id: 'stiffness', kind: 'gain', gain: 'k_t', at: [400, 540] },
    { id: 'v_s_out', kind: 'output', name: 'v_s', unit: 'm/s', at: [360, 40] },
    { id: 'z_out', kind: 'output', name: 'z', unit: 'm', at: [600, 420] },
  ],
  wires: wired(
    'body v_s',
    'v_s travel',
    'v_u travel 1',
    'travel z',
    'z spring',
    'travel damper',
    'v_s actuator',
    'spring force',
    'actuator force 1',
    'damper force 2',
    'force body',
    'force wheel',
    'stiffness wheel 1',
    'wheel hub',
    'hub v_u',
    'v_u tyre',
    'w tyre 1',
    'tyre y',
    'y stiffness',
    'v_s v_s_out',
    'z z_out',
  ),
};
