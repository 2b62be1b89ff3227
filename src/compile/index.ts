/** Diagram to state space: flatten, equations, loops, eliminate, self-check. */

export { type CompileOptions, compile } from './compile.ts';
export type { AlgebraicLoop, Derivation, SelfCheck, SignalName, StateSpace, SystemMatrices } from './state-space.ts';
