/**
 * The trace on the sheet: wires of the paths drawn over in rust and twice as wide, those of loops dashed, blocks outlined, the
 * column's and the row's block with a double line. Over the paper, not in the hand's way.
 */

import './trace.css';
import { type ReactFlowState, useStore as useFlow, ViewportPortal } from 'reactflow';
import type { Trace } from '../../compile/trace/index.ts';
import type { Point } from '../../diagram/index.ts';
import { arrowHead, wirePath } from '../sheet/wire-path.ts';
import { type State, useStore } from '../store/index.ts';
import { marksOf } from './trace-marks.ts';

const traced = ({ pointing: { entry, answer } }: State): Trace | null =>
  entry !== null && answer?.kind === 'entry' ? answer.trace : null;

const nodesOf = (flow: ReactFlowState) => flow.nodes;
const edgesOf = (flow: ReactFlowState) => flow.edges;

const hiddenBlocks = (state: State) => state.pointing.hidden;

export function TraceMarks() {
  const trace = useStore(traced);
  const hidden = useStore(hiddenBlocks);
  return (
    <>
      {trace !== null && <Marks trace={trace} />}
      {trace === null && hidden.length > 0 && <HiddenMarks paths={hidden} />}
    </>
  );
}

/** A dashed outline with a word over it, so that it is not told by its colour. */
function HiddenMarks({ paths }: { readonly paths: readonly string[] }) {
  const nodes = useFlow(nodesOf);
  const marked = new Set(paths.map(path => path.split('.', 1)[0]));
  return (
    <ViewportPortal>
      <svg className="trace-marks" aria-hidden="true">
        {nodes
          .filter(({ id }) => marked.has(id))
          .map(({ id, position: { x, y }, width, height }) => (
            <g key={id} className="trace-block trace-block-loop">
              <Outline {...{ x, y, width: width ?? 0, height: height ?? 0 }} off={OFF} />
              <text className="trace-hidden" x={x} y={y - (height ?? 0) / 2 - OFF - 5}>
                hidden mode
              </text>
            </g>
          ))}
      </svg>
    </ViewportPortal>
  );
}

/** How far a mark stands off the block's box, sheet units; the ends' second line further. */
const OFF = 4;
const OFF_END = 8;

function Marks({ trace }: { readonly trace: Trace }) {
  const nodes = useFlow(nodesOf);
  const edges = useFlow(edgesOf);
  const marks = marksOf(trace);
  return (
    <ViewportPortal>
      <svg className="trace-marks" aria-hidden="true">
        {edges.map(({ id, data }) => {
          const mark = marks.wires.get(id);
          const points = (data as { readonly points?: readonly Point[] } | undefined)?.points ?? [];
          if (mark === undefined || points.length < 2) return null;
          return (
            <g key={id} className={`trace-wire trace-wire-${mark}`}>
              <path d={wirePath(points)} />
              <path className="trace-head" d={arrowHead(points)} />
            </g>
          );
        })}
        {nodes.map(({ id, position: { x, y }, width, height }) => {
          const mark = marks.blocks.get(id);
          if (mark === undefined) return null;
          const box = { x, y, width: width ?? 0, height: height ?? 0 };
          return (
            <g key={id} className={`trace-block trace-block-${mark}`}>
              <Outline {...box} off={OFF} />
              {mark === 'end' && <Outline {...box} off={OFF_END} />}
            </g>
          );
        })}
      </svg>
    </ViewportPortal>
  );
}

interface OutlineProps {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  readonly off: number;
}

function Outline({ x, y, width, height, off }: OutlineProps) {
  const [w, h] = [width + 2 * off, height + 2 * off];
  return <rect x={x - w / 2} y={y - h / 2} width={w} height={h} rx={off} />;
}
