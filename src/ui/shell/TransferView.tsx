/** One channel's transfer function, or why there is none. */

import type { ChannelAnswer, Notation } from '../../worker/index.ts';
import { TransferFunction } from '../figures/index.ts';
import { PanelEmpty } from '../results/index.ts';
import { SymbolicTransfer } from './SymbolicTransfer.tsx';

interface TransferViewProps {
  readonly answer: ChannelAnswer['transferFunction'];
  readonly notation: Notation;
}

export function TransferView({ answer, notation }: TransferViewProps) {
  if (notation === 'symbols') return <SymbolicTransfer channel={{ input: answer.input, output: answer.output }} />;
  if (answer.route === 'not-computed') return <PanelEmpty>{answer.reason}</PanelEmpty>;
  return <TransferFunction {...answer.exact} notation={notation} />;
}
