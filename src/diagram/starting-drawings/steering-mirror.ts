/**
 * A fast steering mirror on flexures (inertia J, damping c, stiffness k), turned by a lead and an integral controller; a notch takes the
 * loop gain down around a structural mode of the mirror cell, which it misses by two per cent. m is the base's disturbing torque.
 * The mirror and its figures are invented data.
 */

import type { Diagram } from '../types.ts';
import { wired } from './wired.ts';

/** States angle, rate, held error, one of the lead, two of the notch, two of the mode; inputs r and m; output theta. */
export const STEERING_MIRROR: Diagram = {
  format: 'poleward-diagram',
  version: 1,
  title: 'Fast steering mirror, notch',
  revision: '1',
  date: '2026-12-01',
  notes: 'A mirror on flexures with a lead, an integral and a notch at a structural mode. Invented data for the demo.',
  parameters: [
    { name: 'J', value: '2e-5', unit: 'kg*m^2', note: 'mirror' },
    { name: 'c', value: '1.5e-3', unit: 'N*m*s', note: 'flexures, damping' },
    { name: 'k', value: '2.8', unit: 'N*m', note: 'flexures, stiffness' },
    { name: 'w_m', value: '5000', unit: 'rad/s', note: 'structural mode' },
    { name: 'w_n', value: '5100', unit: 'rad/s', note: 'notch' },
    { name: 'd_m', value: '0.005', note: 'damping ratio' },
    { name: 'K_p', value: '6.5', unit: 'N*m', note: 'controller' },
    { name: 'T_l', value: '1/350', unit: 's', note: 'lead' },
    { name: 'T_f', value: '1/2600', unit: 's', note: 'lag of the lead' },
    { name: 'K_i', value: '400', unit: 'N*m/s', note: 'controller, integral' },
  ],
  blocks: [
    { id: 'r', kind: 'input', unit: 'rad', at: [40, 180] },
    { id: 'm', kind: 'input', unit: 'N*m', at: [960, 80] },
    { id: 'theta', kind: 'integrator', unit: 'rad', at: [1340, 180] },
    { id: 'rate', kind: 'integrator', unit: 'rad/s', at: [1200, 180] },
    { id: 'q', kind: 'integrator', unit: 'rad*s', at: [260, 60] },
    { id: 'e', kind: 'summer', signs: '+-', at: [140, 180] },
    { id: 'lead', kind: 'transfer-function', numerator: 'K_p*(T_l*s + 1)', denominator: 'T_f*s + 1', at: [300, 180] },
    { id: 'integral', kind: 'gain', gain: 'K_i', at: [360, 60] },
    { id: 'sum', kind: 'summer', signs: '++', at: [440, 180] },
    {
      id: 'notch',
      kind: 'transfer-function',
      numerator: 's^2 + 2*d_m*w_n*s + w_n^2',
      denominator: 's^2 + 1.4*w_n*s + w_n^2',
      at: [600, 180],
    },
    {
      id: 'mode',
      kind: 'transfer-function',
      numerator: 'w_m^2',
      denominator: 's^2 + 2*d_m*w_m*s + w_m^2',
      at: [820, 180],
    },
    { id: 'torque', kind: 'summer', signs: '++--', at: [980, 180] },
    { id: 'inertia', kind: 'gain', gain: '1/J', at: [1080, 180] },
    { id: 'friction', kind: 'gain', gain: 'c', mirrored: true, at: [1080, 280] },
    { id: 'flexure', kind: 'gain', gain: 'k', mirrored: true, at: [1080, 360] },
    { id: 'theta_out', kind: 'output', name: 'theta', unit: 'rad', at: [1460, 180] },
  ],
  wires: wired(
    'r e',
    'theta e 1',
    'e q',
    'e lead',
    'q integral',
    'lead sum',
    'integral sum 1',
    'sum notch',
    'notch mode',
    'mode torque',
    'm torque 1',
    'friction torque 2',
    'flexure torque 3',
    'torque inertia',
    'inertia rate',
    'rate theta',
    'rate friction',
    'theta flexure',
    'theta theta_out',
  ),
};
