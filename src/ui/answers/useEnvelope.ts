/** The band that a curve of the channel on screen runs in over the tolerances, while that is known of this drawing and channel. */

import { useMemo } from 'react';
import type { Band } from '../plots/index.ts';
import { type State, useStore } from '../store/index.ts';
import { isJudgedDrawing } from './judged-drawing.ts';

const tolerances = (state: State) => state.tolerances;
const diagram = (state: State) => state.document.diagram;
const isMoving = (state: State) => state.live !== null;
const channelName = ({ results: { derivation, channel } }: State) => {
  const { input = -1, output = -1 } = channel?.channel ?? {};
  return `${derivation?.model.inputs[input]?.name} ${derivation?.model.outputs[output]?.name}`;
};

export function useEnvelope(curve: 'step' | 'magnitude'): Band | undefined {
  const judged = useStore(tolerances);
  const drawing = useStore(diagram);
  const moving = useStore(isMoving);
  const shown = useStore(channelName);
  return useMemo(() => {
    if (judged === null || moving || !isJudgedDrawing(judged, drawing)) return undefined;
    const { channel, step, magnitude } = judged;
    if (channel === null || `${channel.input} ${channel.output}` !== shown) return undefined;
    if (curve === 'step') return step === null ? undefined : { ...step, along: step.time };
    return magnitude === null ? undefined : { ...magnitude, along: magnitude.omega };
  }, [judged, drawing, moving, shown, curve]);
}
