/** The block under the mouse after a moment's rest, else the one that has the keyboard's focus; Escape lets go of it. */

import { useEffect, useState } from 'react';

/** Long enough that moving across the drawing shows nothing (common practice for tips). */
const MILLISECONDS = 350;

export function usePointedBlock(): string | null {
  const [pointed, setPointed] = useState<string | null>(null);
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    let next: string | null = null;
    const point = (id: string | null) => {
      if (id === next) return;
      next = id;
      clearTimeout(timer);
      if (id === null) setPointed(null);
      else timer = setTimeout(() => setPointed(id), MILLISECONDS);
    };
    const onOver = ({ target, pointerType }: PointerEvent) => {
      if (pointerType !== 'touch') point(blockAround(target));
    };
    const onFocus = ({ target }: FocusEvent) => {
      if (target instanceof Element && target.matches(':focus-visible')) point(blockAround(target));
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

function blockAround(target: EventTarget | null): string | null {
  const node = target instanceof Element ? target.closest<HTMLElement>('.react-flow__node') : null;
  return node?.dataset['id'] ?? null;
}
