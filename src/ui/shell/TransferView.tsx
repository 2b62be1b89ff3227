/** One channel's transfer function, or why there is none. */

import type { ChannelAnswer, Notation } from '../../worker/index.ts';
import { TransferFunction } from '../figures/index.ts';
import { PanelEmpty } from '../results/index.ts';

interface TransferViewProps {
  readonly answer: ChannelAnswer['transferFunction'];
  readonly notation: Notation;
}

export function TransferView({ answer, notation }: TransferViewProps) {
  if (answer.route === 'not-computed') return <PanelEmpty>{answer.reason}</PanelEmpty>;
  return <TransferFunction {...answer.exact} notation={notation} />;
}
