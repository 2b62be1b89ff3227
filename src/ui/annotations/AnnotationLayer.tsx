/**
 * Texts and frames on the sheet, behind wires and blocks. Loaded once a drawing has one or one is being written. A drag is shown
 * live and becomes one edit when it ends.
 */

import './annotations.css';
import { useEffect, useMemo, useState } from 'react';
import { ViewportPortal } from 'reactflow';
import type { Annotation, Point, Sheet } from '../../diagram/index.ts';
import { actions, type State, store, useStore } from '../store/index.ts';
import { AnnotationView } from './AnnotationView.tsx';
import { moveTogether } from './annotation-commands.ts';
import { annotationSentence } from './annotation-texts.ts';
import { withInside } from './inside-frame.ts';
import { WritingField } from './WritingField.tsx';

const diagram = (state: State) => state.document.diagram;
const selected = (state: State) => state.selection.annotations;
const written = (state: State) => state.view.annotating ?? null;
const held = (state: State) => state.held;

/** Annotations in hand and by how much they have moved. */
interface Shift {
  readonly ids: ReadonlySet<string>;
  readonly by: Point;
}

const NONE: readonly Annotation[] = [];

export default function AnnotationLayer() {
  const sheet = useStore(diagram);
  const chosen = useStore(selected);
  const writing = useStore(written);
  const [dragged, setDragged] = useState<Shift | null>(null);
  const shift = useShiftWithBlocks(sheet, chosen) ?? dragged;
  const { annotations = NONE } = sheet;
  const sentences = useMemo(
    () => new Map(annotations.map(annotation => [annotation.id, annotationSentence(annotation, sheet)])),
    [annotations, sheet],
  );
  useEffect(letGoElsewhere, []);
  useEffect(chooseInFrame, []);

  const drag = (id: string, by: Point) => {
    const { ids, blocks } = inHand(sheet, id);
    setDragged({ ids, by });
    actions.hold(
      new Map(sheet.blocks.flatMap(({ id: block, at }) => (blocks.has(block) ? [[block, plus(at, by)]] : []))),
    );
  };
  const drop = (id: string, by: Point | null) => {
    setDragged(null);
    actions.hold(null);
    if (by === null || (by[0] === 0 && by[1] === 0)) return;
    const { selection } = store.getState();
    const isAmong = selection.annotations?.has(id) === true;
    moveTogether(isAmong ? (selection.annotations ?? new Set([id])) : new Set([id]), selection.blocks, by);
  };
  return (
    <ViewportPortal>
      <div className="annotations">
        {annotations.map(annotation => (
          <AnnotationView
            key={annotation.id}
            annotation={annotation}
            by={shift?.ids.has(annotation.id) === true ? shift.by : null}
            isSelected={chosen?.has(annotation.id) === true}
            isWritten={writing?.id === annotation.id}
            sentence={sentences.get(annotation.id) ?? ''}
            onDrag={drag}
            onDrop={drop}
          />
        ))}
      </div>
      {writing !== null && <WritingField key={`${writing.id} ${writing.at}`} annotation={writing} />}
    </ViewportPortal>
  );
}

const plus = ([x, y]: Point = [0, 0], [dx, dy]: Point): Point => [x + dx, y + dy];

/** All that moves with an annotation: what is selected with it, and what stands inside its frames. */
function inHand(sheet: Sheet, id: string): { readonly ids: ReadonlySet<string>; readonly blocks: ReadonlySet<string> } {
  const { selection } = store.getState();
  const isAmong = selection.annotations?.has(id) === true;
  const inside = withInside(sheet, isAmong ? (selection.annotations ?? new Set([id])) : new Set([id]));
  return { ids: inside.annotations, blocks: new Set([...inside.blocks, ...(isAmong ? selection.blocks : [])]) };
}

/** Where selected annotations are while selected blocks are dragged. */
function useShiftWithBlocks(sheet: Sheet, chosen: ReadonlySet<string> | undefined): Shift | null {
  const moved = useStore(held);
  return useMemo(() => {
    const [first] = moved ?? [];
    if (first === undefined || chosen === undefined || chosen.size === 0) return null;
    const [x, y] = sheet.blocks.find(({ id }) => id === first[0])?.at ?? first[1];
    return { ids: withInside(sheet, chosen).annotations, by: [first[1][0] - x, first[1][1] - y] };
  }, [moved, sheet, chosen]);
}

/** A press on the sheet beside all that is selected lets go of the selected annotations. */
function letGoElsewhere(): () => void {
  const onPress = ({ target, shiftKey, ctrlKey, metaKey }: PointerEvent) => {
    const { selection } = store.getState();
    if (!selection.annotations?.size || shiftKey || ctrlKey || metaKey) return;
    if (!(target instanceof Element) || target.closest('.sheet') === null) return;
    if (target.closest('.annotation, .react-flow__node.selected, .react-flow__nodesselection') === null) {
      actions.select({ blocks: selection.blocks, wires: selection.wires });
    }
  };
  window.addEventListener('pointerdown', onPress, { capture: true });
  return () => window.removeEventListener('pointerdown', onPress, { capture: true });
}

/** A selecting frame takes the annotations that lie wholly in it along with the blocks. */
function chooseInFrame(): () => void {
  const onRelease = () => {
    const frame = document.querySelector('.react-flow__selection')?.getBoundingClientRect();
    if (frame === undefined || frame.width === 0) return;
    const isInside = (element: Element) => {
      const { left, top, right, bottom } = element.getBoundingClientRect();
      return left >= frame.left && right <= frame.right && top >= frame.top && bottom <= frame.bottom;
    };
    const found = [...document.querySelectorAll<HTMLElement>('.annotation')].filter(isInside);
    const ids = found.flatMap(({ dataset }) => dataset['annotation'] ?? []);
    const { selection } = store.getState();
    if (ids.length > 0)
      actions.select({ ...selection, annotations: new Set([...(selection.annotations ?? []), ...ids]) });
  };
  window.addEventListener('pointerup', onRelease, { capture: true });
  return () => window.removeEventListener('pointerup', onRelease, { capture: true });
}
