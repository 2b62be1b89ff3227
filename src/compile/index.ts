/** Diagram to state space: flatten, equations, loops, eliminate, derivatives, self-check. */

export { checkModel, compile } from './compile.ts';
export { type CompileOptions, deriveModel, type ModelMemory, newModelMemory } from './derive-model.ts';
export { type OpenedDelay, type OpenedLimiter, type OpenedModel, openedModel } from './opened/index.ts';
export { type DirectResponse, directResponse } from './self-check/index.ts';
export type {
  AlgebraicLoop,
  Derivation,
  SelfCheck,
  SignalName,
  StateSpace,
  SystemMatrices,
  UncheckedDerivation,
} from './state-space.ts';
export { deriveSymbolic, type SymbolicModel } from './symbolic/index.ts';
