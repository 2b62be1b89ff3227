/** The line to the worker, and what it answers on demand. */

export { derivationLine } from './derivation-line.ts';
export { isJudgedDrawing } from './judged-drawing.ts';
export { type Answered, useAnswer } from './useAnswer.ts';
export { useEnvelope } from './useEnvelope.ts';
