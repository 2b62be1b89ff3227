/** Motions with true dead time and acting limiters, for any input signal. Start at simulate.ts. */

export { type Clipping, clippings } from './clip-report.ts';
export type { Piece } from './history.ts';
export { type Simulation, type SimulationRequest, sampled, simulate } from './simulate.ts';
export { type SimulatedFigures, simulatedFigures } from './step-figures.ts';
export type { Stimulus } from './stimulus.ts';
