/** The minimal model and what a model's structure says about each state and mode: start at `minimalModel`, `structureReport`. */

export { type MinimalModel, minimalModel } from './minimal-model.ts';
export {
  type Combination,
  type Contribution,
  channelStates,
  type StructuralMode,
  type StructureReport,
  structureReport,
} from './structure-report.ts';
