/**
 * A heated mixing tank whose level h and temperature theta are both held. The feed q raises the level and cools the content; the
 * heater p warms it; the thermometer stands downstream and shows the temperature a dead time later. All are deviations from an
 * operating point. The plant and its figures are invented data.
 */

import type { Diagram } from '../types.ts';
import { wired } from './wired.ts';

/** States level, temperature, one of each controller and two of the dead time; inputs h_r, d, theta_r; outputs h, theta. */
export const MIXING_TANK: Diagram = {
  format: 'poleward-diagram',
  version: 1,
  title: 'Mixing tank, level and temperature',
  revision: '1',
  date: '2026-12-01',
  notes:
    'A heated tank: the feed holds the level, the heater the temperature, measured with dead time. Invented data for the demo.',
  parameters: [
    { name: 'A_t', value: '0.5', unit: 'm^2', note: 'cross-section' },
    { name: 'a', value: '0.002', unit: 'm^2/s', note: 'outflow for each metre of level' },
    { name: 'K_h', value: '0.01', unit: 'm^2/s', note: 'level controller' },
    { name: 'T_h', value: '200', unit: 's', note: 'its reset time' },
    { name: 'tau', value: '400', unit: 's', note: 'thermal lag' },
    { name: 'k_p', value: '2', unit: 'K/kW', note: 'heating' },
    { name: 'k_q', value: '8000', unit: 'K*s/m^3', note: 'cooling by the feed' },
    { name: 'K_c', value: '2', unit: 'kW/K', note: 'temperature controller' },
    { name: 'T_i', value: '300', unit: 's', note: 'its reset time' },
    { name: 'L', value: '20', unit: 's', note: 'dead time of the thermometer' },
  ],
  blocks: [
    { id: 'h_r', kind: 'input', unit: 'm', at: [40, 120] },
    { id: 'd', kind: 'input', unit: 'm^3/s', at: [500, 40] },
    { id: 'theta_r', kind: 'input', unit: 'K', at: [40, 400] },
    { id: 'h', kind: 'integrator', unit: 'm', at: [740, 120] },
    { id: 'theta', kind: 'integrator', unit: 'K', at: [900, 400] },
    { id: 'e_h', kind: 'summer', signs: '+-', at: [140, 120] },
    { id: 'level', kind: 'transfer-function', numerator: 'K_h*(T_h*s + 1)', denominator: 'T_h*s', at: [300, 120] },
    { id: 'flow', kind: 'summer', signs: '+--', at: [500, 120] },
    { id: 'storage', kind: 'gain', gain: '1/A_t', at: [620, 120] },
    { id: 'outflow', kind: 'gain', gain: 'a', mirrored: true, at: [620, 220] },
    { id: 'e_theta', kind: 'summer', signs: '+-', at: [140, 400] },
    { id: 'heat', kind: 'transfer-function', numerator: 'K_c*(T_i*s + 1)', denominator: 'T_i*s', at: [300, 400] },
    { id: 'heating', kind: 'gain', gain: 'k_p', at: [500, 400] },
    { id: 'warming', kind: 'summer', signs: '+--', at: [640, 400] },
    { id: 'thermal', kind: 'gain', gain: '1/tau', at: [760, 400] },
    { id: 'cooling', kind: 'gain', gain: 'k_q', at: [500, 300] },
    { id: 'thermometer', kind: 'delay', time: 'L', order: 2, mirrored: true, at: [620, 520] },
    { id: 'h_out', kind: 'output', name: 'h', unit: 'm', at: [900, 120] },
    { id: 'theta_out', kind: 'output', name: 'theta', unit: 'K', at: [1040, 400] },
  ],
  wires: wired(
    'h_r e_h',
    'h e_h 1',
    'e_h level',
    'level flow',
    'd flow 1',
    'outflow flow 2',
    'flow storage',
    'storage h',
    'h outflow',
    'h h_out',
    'level cooling',
    'theta_r e_theta',
    'thermometer e_theta 1',
    'e_theta heat',
    'heat heating',
    'heating warming',
    'cooling warming 1',
    'theta warming 2',
    'warming thermal',
    'thermal theta',
    'theta thermometer',
    'theta theta_out',
  ),
};
