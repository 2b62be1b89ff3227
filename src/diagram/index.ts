/**
 * The document: its types, reading and writing, and every edit. Plain immutable data; nothing here knows the screen. Where
 * blocks lie and wires run is in the folders geometry, routing and arranging.
 */

export { checkExpressions } from './check-expressions.ts';
export {
  type DrawingEdit,
  type Edit,
  editDiagram,
  freshId,
  freshName,
  type SheetEdit,
  type SheetPath,
} from './edits/index.ts';
export { emptyDiagram } from './empty-diagram.ts';
export { MAXIMUM_BYTES } from './limits.ts';
export { portCounts } from './port-counts.ts';
export { type QuantityField, quantityFields } from './quantities.ts';
export { readDiagram } from './reading/index.ts';
export {
  boundOf,
  REQUIREMENT_KIND_NAMES,
  type Requirement,
  type RequirementKind,
  type RequirementRule,
  type RequirementSubject,
  requirementRule,
  requirementText,
} from './requirements/index.ts';
export { isSameModel } from './same-model.ts';
export { startingDrawing, type WorkedDrawing, workedDrawings } from './starting-drawings/index.ts';
export { blockTitle, blockTitleAtStart, displayName } from './titles.ts';
export type {
  Annotation,
  Block,
  BlockKind,
  Cut,
  DelayBlock,
  Diagram,
  DifferentiatorBlock,
  GainBlock,
  GroupBlock,
  InputBlock,
  IntegratorBlock,
  LimiterBlock,
  OutputBlock,
  Parameter,
  Point,
  PortReference,
  Quantity,
  Sheet,
  StateModelBlock,
  SummerBlock,
  TransferFunctionBlock,
  Wire,
} from './types.ts';
export { minifyDiagram, writeDiagram } from './write-diagram.ts';
