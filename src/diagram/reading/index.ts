/** Reading documents from text, stage by stage, and the rules that edits share with it. */

export { annotationFault } from './annotation-shape.ts';
export { blockSchemas } from './block-schemas.ts';
export { wireTitle } from './joining.ts';
export { noteNameClashes } from './names.ts';
export { readDiagram } from './read-diagram.ts';
export { beginReading, pathOf, type SheetPlace, TOP_SHEET } from './reading.ts';
export { readRequirement } from './requirement-shape.ts';
export { matrixShapeFault } from './state-model-shape.ts';
export { whatIsWrong } from './wording.ts';
