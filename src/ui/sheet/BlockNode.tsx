/** One block on the sheet: its drawing, its ports for the hand, what is open or wrong about it, its fields when they are edited. */

import { memo } from 'react';
import { Handle, type NodeProps } from 'reactflow';
import { type BlockGeometry, blockDrawing, type PortPlace, type Side } from '../../diagram/geometry/index.ts';
import type { Block } from '../../diagram/index.ts';
import { type State, useStore } from '../store/index.ts';
import { formatValue } from '../title-block/format-value.ts';
import { useHand } from './load-hand.ts';
import { ShapeView } from './ShapeView.tsx';
import { useBlockMark } from './useBlockMark.ts';
import { type BlockFlowNode, FLOW_SIDE } from './useSheetNodes.ts';

export const BlockNode = memo(function BlockNode({ id, data, selected }: NodeProps<BlockFlowNode>) {
  const { block, geometry, openPorts } = data;
  const value = useStore((state: State) => state.results.values.blocks[id]);
  const isEditing = useStore((state: State) => state.view.editing === id);
  const mark = useBlockMark(id);
  const shownValue = value === undefined ? undefined : formatValue(value);
  const { width, height } = geometry.box;
  return (
    <div
      className={`block${selected ? ' block-selected' : ''}${mark === null ? '' : ` block-${mark}`}`}
      style={{ width, height }}
    >
      <svg className="block-drawing" width={width} height={height} aria-hidden="true">
        <g transform={`translate(${width / 2} ${height / 2})`}>
          {geometry.outline === 'terminal' && <circle className="block-reach" r={TERMINAL_REACH} />}
          {Array.from(blockDrawing(block, geometry, shownValue).entries(), ([place, shape]) => (
            <ShapeView key={place} shape={shape} />
          ))}
          {openPorts.map(port => (
            <OpenPort key={port} place={geometry.inputs[port]} />
          ))}
        </g>
      </svg>
      <Ports geometry={geometry} />
      {isEditing && <Fields block={block} />}
    </div>
  );
});

function Fields({ block }: { readonly block: Block }) {
  const hand = useHand();
  return hand === null ? null : <hand.BlockFields block={block} />;
}

/** A ring at an input port that no wire reaches: it reads zero. */
function OpenPort({ place }: { readonly place: PortPlace | undefined }) {
  if (place === undefined) return null;
  return (
    <circle className="open-port" cx={place.x} cy={place.y} r={5}>
      <title>Not connected: reads zero.</title>
    </circle>
  );
}

const OUTWARD: Readonly<Record<Side, readonly [number, number]>> = {
  left: [-1, 0],
  right: [1, 0],
  top: [0, -1],
  bottom: [0, 1],
};

/** A terminal is smaller than a fingertip: it is taken hold of this far around, and its port is moved off it. */
const TERMINAL_REACH = 14;
const PORT_OFF = 9;

const Ports = memo(function Ports({ geometry }: { readonly geometry: BlockGeometry }) {
  const { width, height } = geometry.box;
  const off = geometry.outline === 'terminal' ? PORT_OFF : 0;
  const at = ({ x, y, side }: PortPlace) => {
    const [dx, dy] = OUTWARD[side];
    return { left: width / 2 + x + off * dx, top: height / 2 + y + off * dy };
  };
  return (
    <>
      {Array.from(geometry.inputs.entries(), ([port, place]) => (
        <Handle
          key={`in:${port}`}
          id={`in:${port}`}
          type="target"
          position={FLOW_SIDE[place.side]}
          className="port"
          style={at(place)}
        />
      ))}
      {Array.from(geometry.outputs.entries(), ([port, place]) => (
        <Handle
          key={`out:${port}`}
          id={`out:${port}`}
          type="source"
          position={FLOW_SIDE[place.side]}
          className="port"
          style={at(place)}
        />
      ))}
    </>
  );
});
