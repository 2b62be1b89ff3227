/**
 * What a model does: poles, zeros, transfer functions, stability, structure, responses in time and frequency. Pure functions
 * of a StateSpace; each answer says whether it is proved or computed in doubles. Start at exact-model.ts for the exact
 * answers, at free-response.ts for those in time.
 */

export type { GainCrossover, PhaseCrossover } from './crossovers.ts';
export type { Effort } from './exact-model.ts';
export type { Excitation } from './excitation.ts';
export type { ChannelFrequency, FrequencyCurve } from './frequency-curve.ts';
export { channelFrequency, frequencyCurve, orderAtZero } from './frequency-curve.ts';
export type { FrequencyResponse } from './frequency-response.ts';
export { frequencyResponse } from './frequency-response.ts';
export { hiddenModeWarnings } from './hidden-mode-warnings.ts';
export type { Horizon, HorizonReason } from './horizon.ts';
export type { LoopTransfer } from './loop-transfer.ts';
export { loopTransfer } from './loop-transfer.ts';
export type { DiskMargin, Margins, Peak } from './margins.ts';
export { margins } from './margins.ts';
export { dampingRatio, naturalFrequency, timeConstant } from './pole-figures.ts';
export type { PoleSet, Root } from './poles.ts';
export { poles } from './poles.ts';
export { type Assessment, assess } from './requirements/index.ts';
export {
  type Clipping,
  clippings,
  type SimulatedFigures,
  type Simulation,
  type SimulationRequest,
  type Stimulus,
  sampled,
  simulate,
  simulatedFigures,
} from './simulation/index.ts';
export type { Stability } from './stability.ts';
export { stability } from './stability.ts';
export type { StepMetrics } from './step-metrics.ts';
export { stepMetrics } from './step-metrics.ts';
export type { HiddenMode, Structural } from './structure.ts';
export { hiddenModes, isControllable, isObservable, kalmanRanks } from './structure.ts';
export { type SymbolicTransfer, symbolicTransfer } from './symbolic-transfer.ts';
export type { ResponseRequest, StepResponse, TimeResponse } from './time-response.ts';
export { initialStateResponse, stepResponse, stepValuesAt, timeResponse } from './time-response.ts';
export {
  DEFAULT_SAMPLES,
  diagramAt,
  type Envelope,
  type EnvelopeRequest,
  envelopeOf,
  type JudgedPoint,
  judgePoint,
  MOST_SAMPLES,
  type PointAssessment,
  type TolerancePlan,
  type TolerancePoint,
  type ToleratedParameter,
  tolerancePlan,
  valuesAt,
  type WorstCase,
  worstCases,
} from './tolerances/index.ts';
export type { ReducedFraction, TransferFunction } from './transfer-functions.ts';
export { allTransferFunctions, transferFunction } from './transfer-functions.ts';
export type { ZeroSet } from './zeros.ts';
export { zeros } from './zeros.ts';
