/**
 * A step-down converter averaged over the switching period: the duty ratio sets the mean voltage V_s d at the choke. An inner loop holds
 * the choke's current i, an outer one the output voltage v; i_l is the load's change. The converter and its figures are invented data.
 */

import type { Diagram } from '../types.ts';
import { wired } from './wired.ts';

/** States choke current, output voltage, the current and the voltage controller; inputs v_r and i_l; output v. */
export const BUCK_CONVERTER: Diagram = {
  format: 'poleward-diagram',
  version: 1,
  title: 'Step-down converter, two loops',
  revision: '1',
  date: '2026-12-01',
  notes: 'A 24 V step-down converter, averaged, with a current loop inside a voltage loop. Invented data for the demo.',
  parameters: [
    { name: 'V_s', value: '24', unit: 'V', note: 'supply' },
    { name: 'H', value: '47e-6', unit: 'H', note: 'choke' },
    { name: 'R_c', value: '0.02', unit: 'ohm', note: 'resistance of the choke' },
    { name: 'C_o', value: '220e-6', unit: 'F', note: 'output capacitor' },
    { name: 'R_o', value: '2', unit: 'ohm', note: 'load' },
    { name: 'K_c', value: '0.125', unit: '1/A', note: 'current controller' },
    { name: 'T_c', value: '1e-4', unit: 's', note: 'current controller, reset time' },
    { name: 'K_v', value: '1.4', unit: 'A/V', note: 'voltage controller' },
    { name: 'T_v', value: '5e-4', unit: 's', note: 'voltage controller, reset time' },
  ],
  blocks: [
    { id: 'v_r', kind: 'input', unit: 'V', at: [40, 200] },
    { id: 'i_l', kind: 'input', unit: 'A', at: [1140, 100] },
    { id: 'i', kind: 'integrator', unit: 'A', at: [1040, 200] },
    { id: 'v', kind: 'integrator', unit: 'V', at: [1380, 200] },
    { id: 'e_v', kind: 'summer', signs: '+-', at: [140, 200] },
    { id: 'voltage', kind: 'transfer-function', numerator: 'K_v*(T_v*s + 1)', denominator: 'T_v*s', at: [280, 200] },
    { id: 'e_i', kind: 'summer', signs: '+-', at: [420, 200] },
    { id: 'current', kind: 'transfer-function', numerator: 'K_c*(T_c*s + 1)', denominator: 'T_c*s', at: [560, 200] },
    { id: 'bridge', kind: 'gain', gain: 'V_s', at: [700, 200] },
    { id: 'choke', kind: 'summer', signs: '+--', at: [800, 200] },
    { id: 'rise', kind: 'gain', gain: '1/H', at: [920, 200] },
    { id: 'loss', kind: 'gain', gain: 'R_c', mirrored: true, at: [920, 300] },
    { id: 'node', kind: 'summer', signs: '+--', at: [1140, 200] },
    { id: 'charge', kind: 'gain', gain: '1/C_o', at: [1260, 200] },
    { id: 'load', kind: 'gain', gain: '1/R_o', mirrored: true, at: [1260, 300] },
    { id: 'v_out', kind: 'output', name: 'v', unit: 'V', at: [1500, 200] },
  ],
  wires: wired(
    'v_r e_v',
    'v e_v 1',
    'e_v voltage',
    'voltage e_i',
    'i e_i 1',
    'e_i current',
    'current bridge',
    'bridge choke',
    'loss choke 1',
    'v choke 2',
    'choke rise',
    'rise i',
    'i loss',
    'i node',
    'i_l node 1',
    'load node 2',
    'node charge',
    'charge v',
    'v load',
    'v v_out',
  ),
};
