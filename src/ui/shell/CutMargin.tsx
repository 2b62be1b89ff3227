import type { CutAnswer } from '../../worker/index.ts';
import { phaseMarginText } from '../figures/index.ts';

/** `cut 1: phase margin 48.3° at 0.702 rad/s`, or that there is no loop transfer; for the verdict line. */
export function CutMargin({ cut: { name, outcome } }: { readonly cut: CutAnswer }) {
  return (
    <span>
      {name}: {outcome.ok ? phaseMarginText(outcome.value.margins) : 'no loop transfer'}
    </span>
  );
}
