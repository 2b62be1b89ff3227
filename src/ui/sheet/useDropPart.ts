/** A part dragged from the row of parts and let go on the sheet; on a wire, it goes into that wire. */

import type { DragEvent } from 'react';
import { useReactFlow } from 'reactflow';
import { isPart, PART_MIME } from '../write-line/parts.ts';
import { withHand } from './load-hand.ts';

interface DropPart {
  readonly onDragOver: (event: DragEvent) => void;
  readonly onDrop: (event: DragEvent) => void;
}

export function useDropPart(): DropPart {
  const flow = useReactFlow();
  return {
    onDragOver: event => {
      if (!event.dataTransfer.types.includes(PART_MIME)) return;
      event.preventDefault();
      event.dataTransfer.dropEffect = 'copy';
    },
    onDrop: event => {
      const part = event.dataTransfer.getData(PART_MIME);
      if (!isPart(part)) return;
      event.preventDefault();
      const { x, y } = flow.screenToFlowPosition({ x: event.clientX, y: event.clientY });
      withHand(hand => hand.placePartInWire(part, [x, y]));
    },
  };
}
