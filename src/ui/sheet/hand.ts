/** What answers the hand on the sheet, in one part that is loaded right after the drawing: wires drawn, parts and blocks let go, grips, fields. */

import { straightenWires } from '../commands/bend-chosen.ts';
import { dropBlock, placePartInWire } from '../commands/insert-in-wire.ts';
import { AlignmentLines } from './AlignmentLines.tsx';
import { BendGrips } from './BendGrips.tsx';
import { BlockFields } from './BlockFields.tsx';
import { DropTarget } from './DropTarget.tsx';
import { connect, dropDrawnWire } from './drop-wire.ts';
import { EndGrips } from './EndGrips.tsx';

export const HAND = {
  connect,
  dropDrawnWire,
  dropBlock,
  placePartInWire,
  straightenWires,
  AlignmentLines,
  BendGrips,
  BlockFields,
  DropTarget,
  EndGrips,
} as const;
