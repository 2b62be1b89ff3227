/**
 * The block or wire under the mouse after a moment's rest, else the block that has the keyboard's focus or the wire that was
 * chosen by key; Escape lets go of it.
 */

import { useEffect, useState } from 'react';
import { type State, useStore } from '../store/index.ts';

/** A block by its id, or a wire by its key, on the sheet that is shown. */
export type PartOnSheet =
  | { readonly block: string }
  /** `isChosen`: it is not pointed at but selected, so that its grips lie open. */
  | { readonly wire: string; readonly isChosen: boolean };

/** Long enough that moving across the drawing shows nothing (common practice for tips). */
const MILLISECONDS = 350;

/** The one wire that is selected; null where there is none or more. */
const chosenWire = ({ selection: { wires, blocks } }: State): string | null =>
  wires.size === 1 && blocks.size === 0 ? ([...wires][0] ?? null) : null;

export function usePointedPart(): PartOnSheet | null {
  const [pointed, setPointed] = useState<PartOnSheet | null>(null);
  const chosen = useStore(chosenWire);
  useEffect(() => setPointed(chosen === null ? null : { wire: chosen, isChosen: true }), [chosen]);
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    let next = '';
    const point = (part: PartOnSheet | null) => {
      const key = JSON.stringify(part);
      if (key === next) return;
      next = key;
      clearTimeout(timer);
      if (part === null) setPointed(null);
      else timer = setTimeout(() => setPointed(part), MILLISECONDS);
    };
    const onOver = ({ target, pointerType }: PointerEvent) => {
      if (pointerType !== 'touch') point(partAround(target));
    };
    const onFocus = ({ target }: FocusEvent) => {
      if (target instanceof Element && target.matches(':focus-visible')) point(partAround(target));
    };
    const onKey = ({ key }: KeyboardEvent) => {
      if (key === 'Escape') point(null);
    };
    const onPress = () => point(null);
    document.addEventListener('pointerover', onOver);
    document.addEventListener('pointerdown', onPress);
    document.addEventListener('focusin', onFocus);
    document.addEventListener('keydown', onKey, true);
    return () => {
      clearTimeout(timer);
      document.removeEventListener('pointerover', onOver);
      document.removeEventListener('pointerdown', onPress);
      document.removeEventListener('focusin', onFocus);
      document.removeEventListener('keydown', onKey, true);
    };
  }, []);
  return pointed;
}

function partAround(target: EventTarget | null): PartOnSheet | null {
  if (!(target instanceof Element)) return null;
  const node = target.closest<HTMLElement>('.react-flow__node')?.dataset['id'];
  if (node !== undefined) return { block: node };
  const wire = target.closest<SVGElement>('.react-flow__edge')?.dataset['id'];
  return wire === undefined ? null : { wire, isChosen: false };
}
