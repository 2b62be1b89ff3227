/**
 * A worked drawing to start from: a winch that keeps the tension of a survey line at r while the vessel's heave v pulls at it.
 * A PI controller sets the motor's torque T, which follows with the lag tau; the drum (inertia J, friction b, radius R)
 * winds a line of stiffness k. The scenario and its figures are our own.
 */

import type { Block, Diagram, Parameter, Point, Wire } from '../types.ts';

/** Centre heights of the rows: the controller with its parallel path, the drum and line with their paths back. */
const ROW = { parallel: 60, controller: 160, reaction: 300, heave: 360, plant: 440, friction: 540 } as const;

/** The states come first, in the order in which the model shows them. */
const BLOCKS: readonly Block[] = [
  { id: 'r', kind: 'input', unit: 'N', at: [40, ROW.controller] },
  { id: 'v', kind: 'input', unit: 'm/s', at: [640, ROW.heave] },
  { id: 'omega', kind: 'integrator', unit: 'rad/s', at: [400, ROW.plant] },
  { id: 'F', kind: 'integrator', unit: 'N', at: [880, ROW.plant] },
  { id: 'q', kind: 'integrator', unit: 'N*s', at: [280, ROW.controller] },
  { id: 'T', kind: 'integrator', unit: 'N*m', at: [760, ROW.controller] },
  { id: 'e', kind: 'summer', signs: '+-', at: [160, ROW.controller] },
  { id: 'proportional', kind: 'gain', gain: 'K_p', at: [340, ROW.parallel] },
  { id: 'integral', kind: 'gain', gain: 'K_i', at: [400, ROW.controller] },
  { id: 'demand', kind: 'summer', signs: '++-', at: [520, ROW.controller] },
  { id: 'lag', kind: 'gain', gain: '1/tau', at: [640, ROW.controller] },
  { id: 'torque', kind: 'summer', signs: '+--', at: [160, ROW.plant] },
  { id: 'drum', kind: 'gain', gain: '1/J', at: [280, ROW.plant] },
  { id: 'friction', kind: 'gain', gain: 'b', mirrored: true, at: [340, ROW.friction] },
  { id: 'winding', kind: 'gain', gain: 'R', at: [520, ROW.plant] },
  { id: 'stretch', kind: 'summer', signs: '++', at: [640, ROW.plant] },
  { id: 'line', kind: 'gain', gain: 'k', at: [760, ROW.plant] },
  { id: 'reaction', kind: 'gain', gain: 'R', mirrored: true, at: [760, ROW.reaction] },
  { id: 'F_out', kind: 'output', name: 'F', unit: 'N', at: [1000, ROW.plant] },
];

/** The tension's way back, underneath everything. */
const FEEDBACK: readonly Point[] = [
  [940, ROW.plant],
  [940, 620],
  [40, 620],
  [40, 240],
  [160, 240],
];

/** The torque's way from the end of the upper row to the beginning of the lower one. */
const TO_THE_DRUM: readonly Point[] = [
  [840, ROW.controller],
  [840, 260],
  [100, 260],
  [100, ROW.plant],
];

const WIRES: readonly Wire[] = [
  { from: ['r', 0], to: ['e', 0] },
  { from: ['F', 0], to: ['e', 1], via: FEEDBACK },
  { from: ['e', 0], to: ['q', 0] },
  { from: ['e', 0], to: ['proportional', 0] },
  { from: ['q', 0], to: ['integral', 0] },
  { from: ['integral', 0], to: ['demand', 0] },
  { from: ['proportional', 0], to: ['demand', 1] },
  { from: ['T', 0], to: ['demand', 2] },
  { from: ['demand', 0], to: ['lag', 0] },
  { from: ['lag', 0], to: ['T', 0] },
  { from: ['T', 0], to: ['torque', 0], via: TO_THE_DRUM },
  { from: ['reaction', 0], to: ['torque', 1] },
  { from: ['friction', 0], to: ['torque', 2] },
  { from: ['torque', 0], to: ['drum', 0] },
  { from: ['drum', 0], to: ['omega', 0] },
  { from: ['omega', 0], to: ['friction', 0] },
  { from: ['omega', 0], to: ['winding', 0] },
  { from: ['winding', 0], to: ['stretch', 0] },
  { from: ['v', 0], to: ['stretch', 1] },
  { from: ['stretch', 0], to: ['line', 0] },
  { from: ['line', 0], to: ['F', 0] },
  { from: ['F', 0], to: ['reaction', 0] },
  { from: ['F', 0], to: ['F_out', 0] },
];

const PARAMETERS: readonly Parameter[] = [
  { name: 'J', value: '0.8', unit: 'kg*m^2', note: 'drum and rotor' },
  { name: 'b', value: '3.2', unit: 'N*m*s', note: 'bearing friction' },
  { name: 'R', value: '0.25', unit: 'm', note: 'drum radius' },
  { name: 'k', value: '12', unit: 'N/m', note: 'line stiffness' },
  { name: 'tau', value: '0.05', unit: 's', note: 'lag of the torque' },
  { name: 'K_p', value: '0.5', unit: 'm', note: 'controller, proportional' },
  { name: 'K_i', value: '0.4', unit: 'm/s', note: 'controller, integral' },
];

/** The winch with its tension loop closed: states ω, F, q, T; inputs r and v; output F. */
export const SURVEY_WINCH: Diagram = {
  format: 'poleward-diagram',
  version: 1,
  title: 'Survey winch, line tension',
  revision: '7',
  date: '2026-12-01',
  notes: 'A winch that keeps the tension of a survey line while the vessel heaves.',
  parameters: PARAMETERS,
  blocks: BLOCKS,
  wires: WIRES,
};
