/** What stands inside a frame, and so goes with it; and where a frame goes when what it stood around has been arranged. */

import {
  annotationArea,
  blockBox,
  FRAME_TITLE,
  GRID,
  type Rectangle,
  sheetBounds,
  sheetGeometry,
} from '../../diagram/geometry/index.ts';
import type { Annotation, Block, Edit, Point, Sheet } from '../../diagram/index.ts';

interface Inside {
  /** Ids. */
  readonly blocks: ReadonlySet<string>;
  readonly annotations: ReadonlySet<string>;
}

const NOTHING: Inside = { blocks: new Set(), annotations: new Set() };

/** Blocks and annotations that lie wholly inside a frame; none inside a text. */
export function insideFrame(sheet: Sheet, frame: Annotation): Inside {
  if (frame.kind !== 'frame') return NOTHING;
  const area = annotationArea(frame);
  const blocks = sheet.blocks.filter(block => holds(area, frameOf(block)));
  const annotations = (sheet.annotations ?? []).filter(
    other => other.id !== frame.id && holds(area, annotationArea(other)) && !isSameArea(other, frame),
  );
  return { blocks: new Set(blocks.map(({ id }) => id)), annotations: new Set(annotations.map(({ id }) => id)) };
}

function frameOf(block: Block): Rectangle {
  const [x, y] = block.at ?? [0, 0];
  const { width, height } = blockBox(block);
  return { left: x - width / 2, right: x + width / 2, top: y - height / 2, bottom: y + height / 2 };
}

function holds(outer: Rectangle, inner: Rectangle): boolean {
  return (
    inner.left >= outer.left && inner.right <= outer.right && inner.top >= outer.top && inner.bottom <= outer.bottom
  );
}

/** Two frames of one area would each be inside the other. */
function isSameArea(a: Annotation, b: Annotation): boolean {
  return a.kind === b.kind && `${a.at} ${a.size}` === `${b.at} ${b.size}`;
}

/** The annotations with all that stands inside those that are frames. */
export function withInside(sheet: Sheet, ids: ReadonlySet<string>): Inside {
  const [blocks, annotations] = [new Set<string>(), new Set(ids)];
  for (const frame of sheet.annotations ?? []) {
    if (!ids.has(frame.id)) continue;
    const inside = insideFrame(sheet, frame);
    for (const id of inside.blocks) blocks.add(id);
    for (const id of inside.annotations) annotations.add(id);
  }
  return { blocks, annotations };
}

/** Corner and size of a frame around blocks, on the grid, with room for its title; null around nothing. */
export function frameAround(sheet: Sheet, ids: ReadonlySet<string>): Pick<Annotation, 'at' | 'size'> | null {
  const geometry = sheetGeometry(sheet);
  const chosen = sheet.blocks.filter(({ id }) => ids.has(id));
  const bounds = sheetBounds({ blocks: chosen, wires: [] }, geometry);
  if (bounds === null) return null;
  const down = (value: number) => Math.floor(value / GRID) * GRID;
  const up = (value: number) => Math.ceil(value / GRID) * GRID;
  const [left, top] = [down(bounds.left - GRID / 2), down(bounds.top - FRAME_TITLE - GRID / 2)];
  return { at: [left, top], size: [up(bounds.right + GRID / 2) - left, up(bounds.bottom + GRID / 2) - top] };
}

/**
 * Edits that put each frame around the blocks it stood around, now that they are elsewhere; what else stood in it comes along
 * with its corner. A frame around nothing that moved stays.
 */
export function framesFollowing(sheet: Sheet, places: ReadonlyMap<string, Point>): readonly Edit[] {
  const moved: Sheet = {
    ...sheet,
    blocks: sheet.blocks.map(block => {
      const at = places.get(block.id);
      return at === undefined ? block : { ...block, at };
    }),
  };
  const brought = new Set<string>();
  return (sheet.annotations ?? []).flatMap((frame): Edit[] => {
    const inside = insideFrame(sheet, frame);
    if (![...inside.blocks].some(id => places.has(id))) return [];
    const around = frameAround(moved, inside.blocks);
    if (around === null) return [];
    const [dx, dy] = [around.at[0] - frame.at[0], around.at[1] - frame.at[1]];
    const texts = (sheet.annotations ?? []).filter(
      ({ id, kind }) => kind === 'text' && inside.annotations.has(id) && !brought.has(id),
    );
    for (const { id } of texts) brought.add(id);
    return [
      { kind: 'setAnnotation', id: frame.id, place: around.at, size: around.size },
      { kind: 'moveAnnotations', ids: texts.map(({ id }) => id), dx, dy },
    ];
  });
}
