/** First pass: the drawing without groups, its ports and signals numbered. */

export type { FlatBlock, FlatDrawing, SimpleBlock } from './flat-drawing.ts';
export { blockOfSignals, OPEN, signalCount } from './flat-drawing.ts';
export { flatten } from './flatten.ts';
export { openPortWarnings } from './open-ports.ts';
export { titleAtStart, titleOf } from './titles.ts';
