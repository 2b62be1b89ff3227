/** What is known of the wire that is pointed at: its signal and unit, from where to where, and how many entries it takes part in. */

import { useViewport } from 'reactflow';
import { type Block, displayName, type Sheet } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { statesOfBlock } from '../commands/states-of-block.ts';
import { piecesOf } from './bend-wire.ts';
import { shownTitle } from './block-sentence.ts';
import { Fact } from './Fact.tsx';
import { shownSheet } from './shown-sheet.ts';

/** Pixels between the wire and the card. */
const UNDERNEATH = 12;

interface WireCardProps {
  readonly wire: string;
  readonly sheet: Sheet;
  /** How many entries it takes part in, as text. */
  readonly entries: string;
}

export function WireCard({ wire: key, sheet, entries }: WireCardProps) {
  const { x, y, zoom } = useViewport();
  const index = sheet.wires.findIndex(wire => wireKey(wire) === key);
  const wire = sheet.wires[index];
  const [first, ...others] = piecesOf(shownSheet().routes.wires[index]?.points ?? []);
  if (wire === undefined || first === undefined) return null;
  const { middle } = others.reduce((longest, piece) => (piece.length > longest.length ? piece : longest), first);
  const from = sheet.blocks.find(({ id }) => id === wire.from[0]);
  const to = sheet.blocks.find(({ id }) => id === wire.to[0]);
  if (from === undefined || to === undefined) return null;
  const { carries } = statesOfBlock(sheet, from.id);
  return (
    <div
      className="block-card"
      role="tooltip"
      style={{ left: x + zoom * middle[0], top: y + zoom * middle[1] + UNDERNEATH }}
    >
      <strong>{`${shownTitle(from)} → ${shownTitle(to)}`}</strong>
      <dl>
        <Fact name="signal" text={wire.name ?? displayName(from)} />
        {unitOf(from) !== null && <Fact name="unit" text={unitOf(from) ?? ''} />}
        {carries.length > 0 && <Fact name="carries" text={carries.join(', ')} />}
        <Fact name="entries" text={entries} />
      </dl>
    </div>
  );
}

function unitOf(block: Block): string | null {
  return 'unit' in block && block.unit !== undefined ? block.unit : null;
}
