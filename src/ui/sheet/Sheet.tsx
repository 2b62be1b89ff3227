/**
 * The drawing surface. The diagram is the truth; React Flow is handed nodes and edges made from it and only reports what
 * the hand does. A drag is shown live and becomes one edit when it ends.
 */

import 'reactflow/dist/base.css';
import { lazy, Suspense, useEffect } from 'react';
import { Background, BackgroundVariant, ConnectionMode, ReactFlow, type ReactFlowState, useStore } from 'reactflow';
import { GRID } from '../../diagram/geometry/index.ts';
import { type State, useStore as useDocument } from '../store/index.ts';
import { BlockNode } from './BlockNode.tsx';
import { BranchDots } from './BranchDots.tsx';
import { DrawnWire } from './DrawnWire.tsx';
import { ZOOM_ENDS } from './glide-view.ts';
import { loadHand, useHand } from './load-hand.ts';
import { SHEET_EVENTS } from './sheet-events.ts';
import { useDropPart } from './useDropPart.ts';
import { useFitOnOpening } from './useFitOnOpening.ts';
import { usePlacedSheet } from './usePlacedSheet.ts';
import { useSheetNodes } from './useSheetNodes.ts';
import { useSheetView } from './useSheetView.ts';
import { useSheetWires } from './useSheetWires.ts';
import { WireEdge } from './WireEdge.tsx';

/** Loaded once a drawing has a cut. */
const CutMarks = lazy(() => import('./CutMarks.tsx').then(file => ({ default: file.CutMarks })));

/** Loaded once a drawing has a text or frame, or one is being written. */
const AnnotationLayer = lazy(() => import('../annotations/AnnotationLayer.tsx'));

const NODE_TYPES = { block: BlockNode };
const EDGE_TYPES = { wire: WireEdge };
const CENTRE: [number, number] = [0.5, 0.5];

/** Above this many blocks only those in view are kept in the page (dependencies: measured at some 300). */
const ALL_IN_PAGE = 300;

/** Below this zoom what is written beside blocks cannot be read and is left out. */
const FAR = 0.35;

/** Below this one nothing that is written can be read. */
const FARTHER = 0.14;

const farness = ({ transform: [, , zoom] }: ReactFlowState) =>
  zoom < FARTHER ? ' sheet-far sheet-farther' : zoom < FAR ? ' sheet-far' : '';

const hasCuts = (state: State) => state.document.diagram.cuts !== undefined;

const hasAnnotations = ({ document, view }: State) =>
  document.diagram.annotations !== undefined || (view.annotating ?? null) !== null;

export function Sheet() {
  const placed = usePlacedSheet();
  const nodes = useSheetNodes(placed);
  const edges = useSheetWires(placed);
  const drop = useDropPart();
  const isCut = useDocument(hasCuts);
  const isAnnotated = useDocument(hasAnnotations);
  const far = useStore(farness);
  const hand = useHand();
  useFitOnOpening();
  useSheetView();
  useEffect(() => void loadHand(), []);
  return (
    <div
      className={`sheet${far}`}
      // biome-ignore lint/a11y/noNoninteractiveTabindex: the sheet takes keys, and an empty one holds nothing to focus
      tabIndex={0}
      role="application"
      aria-label="Block diagram. Press ? for all keys."
      {...drop}
    >
      <ReactFlow
        nodes={nodes}
        edges={edges}
        nodeTypes={NODE_TYPES}
        edgeTypes={EDGE_TYPES}
        nodeOrigin={CENTRE}
        minZoom={ZOOM_ENDS.smallest}
        maxZoom={ZOOM_ENDS.largest}
        connectionMode={ConnectionMode.Strict}
        connectionLineComponent={DrawnWire}
        connectionRadius={22}
        deleteKeyCode={null}
        selectionKeyCode="Shift"
        multiSelectionKeyCode={['Control', 'Meta', 'Shift']}
        zoomOnDoubleClick={false}
        disableKeyboardA11y
        edgesFocusable={false}
        edgesReconnectable={false}
        elevateNodesOnSelect={false}
        onlyRenderVisibleElements={nodes.length > ALL_IN_PAGE}
        {...SHEET_EVENTS}
      >
        <Background variant={BackgroundVariant.Lines} gap={GRID} lineWidth={1} color="var(--square)" />
        <BranchDots dots={placed.routes.dots} />
        <Suspense>{isAnnotated && <AnnotationLayer />}</Suspense>
        <Suspense>{isCut && <CutMarks {...placed} />}</Suspense>
        {hand !== null && <hand.AlignmentLines {...placed} />}
        {hand !== null && <hand.DropTarget />}
      </ReactFlow>
    </div>
  );
}
