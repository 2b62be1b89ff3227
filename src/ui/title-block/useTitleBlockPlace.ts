/**
 * The title block's corner, looked for again when blocks or the view have come to rest, when the window changes and when the
 * hand leaves it; never while the hand is on it. Unfolded by hand it stays unfolded until another drawing is opened.
 */

import { type RefObject, useCallback, useEffect, useRef, useState } from 'react';
import { useOnViewportChange } from 'reactflow';
import type { Rectangle } from '../../diagram/geometry/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { type Size, type TitleBlockPlace, titleBlockPlace } from './title-block-place.ts';

/** Milliseconds until blocks and view have come to rest, gliding included. */
const REST = 260;

/** Free paper around the title block, pixels; as in title-block.css. */
const MARGIN = 14;

const START: TitleBlockPlace = { corner: 'lower-right', isFolded: false };

const drawing = (state: State) => state.document.key;
const blocks = (state: State) => state.document.diagram.blocks;
const annotations = (state: State) => state.document.diagram.annotations;
const folded = (state: State) => state.view.folded;

export function useTitleBlockPlace(section: RefObject<HTMLElement | null>) {
  const [place, setPlace] = useState(START);
  const [isHeldOpen, holdOpen] = useState(false);
  const key = useStore(drawing);
  const placed = useStore(blocks);
  const noted = useStore(annotations);
  const isFoldedByHand = useStore(folded);
  const open = useRef<Size | null>(null);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const isFolded = isFoldedByHand || (place.isFolded && !isHeldOpen);

  const settle = useCallback(() => {
    const own = section.current;
    if (own === null || isHandOn(own) || getComputedStyle(own).position === 'static') return;
    const size = { width: own.offsetWidth, height: own.offsetHeight };
    if (!isFolded) open.current = size;
    const sizes = { open: isFoldedByHand || isHeldOpen ? null : open.current, folded: isFolded ? size : titleRow(own) };
    if (isHeldOpen) return;
    setPlace(former => {
      const next = titleBlockPlace(former.corner, sizes, freeArea(own), blockBoxes());
      return next.corner === former.corner && next.isFolded === former.isFolded ? former : next;
    });
  }, [section, isFolded, isFoldedByHand, isHeldOpen]);

  const settleSoon = useCallback(() => {
    clearTimeout(timer.current);
    timer.current = setTimeout(settle, REST);
  }, [settle]);

  // biome-ignore lint/correctness/useExhaustiveDependencies: another drawing starts from the lower right again
  useEffect(() => {
    holdOpen(false);
    setPlace(START);
  }, [key]);
  // biome-ignore lint/correctness/useExhaustiveDependencies: blocks that were placed or moved ask for a look
  useEffect(settleSoon, [settleSoon, placed, noted, key]);
  useEffect(() => () => clearTimeout(timer.current), []);
  useOnViewportChange({ onEnd: settleSoon });
  useEffect(() => {
    const own = section.current;
    window.addEventListener('resize', settleSoon);
    own?.addEventListener('pointerleave', settleSoon);
    own?.addEventListener('focusout', settleSoon);
    return () => {
      window.removeEventListener('resize', settleSoon);
      own?.removeEventListener('pointerleave', settleSoon);
      own?.removeEventListener('focusout', settleSoon);
    };
  }, [section, settleSoon]);

  const fold = useCallback((wanted: boolean) => {
    holdOpen(!wanted);
    actions.foldTitleBlock(wanted);
  }, []);
  return { corner: place.corner, isFolded, fold };
}

function isHandOn(own: HTMLElement): boolean {
  return own.matches(':hover') || own.contains(document.activeElement);
}

function titleRow(own: HTMLElement): Size {
  const row = own.querySelector<HTMLElement>('.title-block-row');
  return { width: own.offsetWidth, height: row?.offsetHeight ?? 0 };
}

function freeArea(own: HTMLElement): Rectangle {
  const sheet = own.parentElement?.getBoundingClientRect() ?? new DOMRect();
  const line = document.querySelector('.write-line')?.getBoundingClientRect();
  return {
    left: sheet.left + MARGIN,
    right: sheet.right - MARGIN,
    top: sheet.top + MARGIN,
    bottom: (line?.top ?? sheet.bottom) - MARGIN / 2,
  };
}

function blockBoxes(): readonly Rectangle[] {
  return [...document.querySelectorAll('.react-flow__node, .annotation')].map(node => node.getBoundingClientRect());
}
