/**
 * What is known of the block or wire that is pointed at or has the focus: value, unit, signal, the states and entries it takes
 * part in.
 */

import { useEffect, useMemo } from 'react';
import { useViewport } from 'reactflow';
import { blockRectangle, sheetGeometry } from '../../diagram/geometry/index.ts';
import { type Block, displayName, type Sheet } from '../../diagram/index.ts';
import { statesOfBlock } from '../commands/states-of-block.ts';
import { actions, type PointedPart, type State, useStore } from '../store/index.ts';
import { formatValue } from '../title-block/format-value.ts';
import { shownTitle } from './block-sentence.ts';
import { Fact } from './Fact.tsx';
import { type PartOnSheet, usePointedPart } from './usePointedPart.ts';
import { WireCard } from './WireCard.tsx';

const diagram = (state: State) => state.document.diagram;
const isBusy = (state: State) => state.held !== null || state.view.editing !== null || state.view.dialog !== null;

export function BlockCard() {
  const pointed = usePointedPart();
  const sheet = useStore(diagram);
  const busy = useStore(isBusy);
  const part = busy ? null : pointed;
  useEffect(() => actions.pointAtPart(part === null ? null : inDrawing(part)), [part]);
  const block = part === null || 'wire' in part ? undefined : sheet.blocks.find(({ id }) => id === part.block);
  const entries = useStore(entryText);
  if (part !== null && 'wire' in part) {
    return part.isChosen ? null : <WireCard wire={part.wire} sheet={sheet} entries={entries} />;
  }
  return block === undefined ? null : <ShownCard block={block} sheet={sheet} entries={entries} />;
}

/** The part of the sheet that is shown as part of the whole drawing. */
function inDrawing(part: PartOnSheet): PointedPart {
  if ('block' in part) return part;
  const at = part.wire.lastIndexOf(':');
  return { wire: { sheet: '', block: part.wire.slice(0, at), port: Number(part.wire.slice(at + 1)) } };
}

/** How many of the entries that the block takes part in, once that is known. */
const entryText = ({ pointing: { part, answer } }: State): string =>
  part !== null && answer?.kind === 'part' && JSON.stringify(answer.part) === JSON.stringify(part)
    ? `${answer.entries.length} of the system matrix`
    : '…';

/** Pixels between the block, its labels and the card. */
const UNDERNEATH = 26;

interface ShownCardProps {
  readonly block: Block;
  readonly sheet: Sheet;
  readonly entries: string;
}

function ShownCard({ block, sheet, entries }: ShownCardProps) {
  const value = useStore((state: State) => state.results.values.blocks[block.id]);
  const { x, y, zoom } = useViewport();
  const frame = useMemo(() => {
    const placed = sheetGeometry(sheet).get(block.id);
    return placed === undefined ? null : blockRectangle(block, placed);
  }, [sheet, block]);
  const { carries, drives } = useMemo(() => statesOfBlock(sheet, block.id), [sheet, block.id]);
  if (frame === null) return null;
  const left = x + zoom * ((frame.left + frame.right) / 2);
  const top = y + zoom * frame.bottom + UNDERNEATH * Math.max(zoom, 0.5);
  return (
    <div className="block-card" role="tooltip" style={{ left, top }}>
      <strong>{shownTitle(block)}</strong>
      <dl>
        {factsOf(block, value).map(([name, text]) => (
          <Fact key={name} name={name} text={text} />
        ))}
        {carries.length > 0 && <Fact name="carries" text={carries.join(', ')} />}
        {drives.length > 0 && <Fact name="drives" text={drives.map(name => `d${name}/dt`).join(', ')} />}
        <Fact name="entries" text={entries} />
      </dl>
    </div>
  );
}

function factsOf(block: Block, value: number | undefined): readonly (readonly [string, string])[] {
  const facts: (readonly [string, string])[] = [];
  if (value !== undefined) facts.push(['value', formatValue(value)]);
  if (block.kind === 'transfer-function') facts.push(['value', `(${block.numerator})/(${block.denominator})`]);
  if (block.kind === 'summer') facts.push(['signs', block.signs]);
  if ('unit' in block && block.unit !== undefined) facts.push(['unit', block.unit]);
  facts.push(['signal', displayName(block)]);
  if (block.note !== undefined) facts.push(['note', block.note]);
  return facts;
}
