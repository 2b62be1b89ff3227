/**
 * A vessel that keeps its heading psi at r. The yaw rate follows the rudder with gain K and lag T (the first-order steering model,
 * K. Nomoto and others, 1957); the rudder follows its demand with the lag tau; w is the waves' turning effect as a rate.
 * The vessel and its figures are invented data.
 */

import type { Diagram } from '../types.ts';
import { wired } from './wired.ts';

/** States yaw rate, heading, held error, rudder angle; inputs r and w; output psi. */
export const HEADING_AUTOPILOT: Diagram = {
  format: 'poleward-diagram',
  version: 1,
  title: 'Coaster, heading autopilot',
  revision: '1',
  date: '2026-12-01',
  notes: 'A coaster keeps its heading by rudder while waves turn it. Invented data for the demo.',
  parameters: [
    { name: 'K', value: '0.05', unit: '1/s', note: 'rudder to rate' },
    { name: 'T', value: '50', unit: 's', note: 'steering lag' },
    { name: 'tau', value: '2.5', unit: 's', note: 'steering gear' },
    { name: 'K_p', value: '1.2', note: 'controller, heading' },
    { name: 'K_d', value: '25', unit: 's', note: 'controller, yaw rate' },
    { name: 'K_i', value: '0.004', unit: '1/s', note: 'controller, integral' },
  ],
  blocks: [
    { id: 'r', kind: 'input', unit: 'rad', at: [40, 160] },
    { id: 'w', kind: 'input', unit: 'rad/s', at: [980, 60] },
    { id: 'rate', kind: 'integrator', unit: 'rad/s', at: [1200, 160] },
    { id: 'psi', kind: 'integrator', unit: 'rad', at: [1340, 160] },
    { id: 'q', kind: 'integrator', unit: 'rad*s', at: [260, 60] },
    { id: 'delta', kind: 'integrator', unit: 'rad', at: [740, 160] },
    { id: 'e', kind: 'summer', signs: '+-', at: [140, 160] },
    { id: 'proportional', kind: 'gain', gain: 'K_p', at: [300, 160] },
    { id: 'integral', kind: 'gain', gain: 'K_i', at: [360, 60] },
    { id: 'demand', kind: 'summer', signs: '++-', at: [460, 160] },
    { id: 'follow', kind: 'summer', signs: '+-', at: [540, 160] },
    { id: 'lag', kind: 'gain', gain: '1/tau', at: [640, 160] },
    { id: 'effect', kind: 'gain', gain: 'K', at: [880, 160] },
    { id: 'turn', kind: 'summer', signs: '++-', at: [980, 160] },
    { id: 'steering', kind: 'gain', gain: '1/T', at: [1080, 160] },
    { id: 'damping', kind: 'gain', gain: 'K_d', mirrored: true, at: [840, 320] },
    { id: 'psi_out', kind: 'output', name: 'psi', unit: 'rad', at: [1460, 160] },
  ],
  wires: wired(
    'r e',
    'psi e 1',
    'e q',
    'e proportional',
    'q integral',
    'proportional demand',
    'integral demand 1',
    'damping demand 2',
    'demand follow',
    'delta follow 1',
    'follow lag',
    'lag delta',
    'delta effect',
    'effect turn',
    'w turn 1',
    'rate turn 2',
    'turn steering',
    'steering rate',
    'rate psi',
    'rate damping',
    'psi psi_out',
  ),
};
