import { type RefObject, useLayoutEffect, useState } from 'react';

/** What a scrolling element shows of its content, CSS pixels. */
export interface ScrollView {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
}

/** A desk-sized first guess, before the element is laid out. */
const UNKNOWN: ScrollView = { left: 0, top: 0, width: 640, height: 480 };

/** The part of its content that the element in `ref` shows, followed as it scrolls and changes size; only where `isWanted`. */
export function useScrollView(ref: RefObject<HTMLElement | null>, isWanted: boolean): ScrollView {
  const [view, setView] = useState(UNKNOWN);
  useLayoutEffect(() => {
    const element = ref.current;
    if (element === null || !isWanted) return;
    const look = () =>
      setView({
        left: element.scrollLeft,
        top: element.scrollTop,
        width: element.clientWidth,
        height: element.clientHeight,
      });
    look();
    const observer = new ResizeObserver(look);
    observer.observe(element);
    element.addEventListener('scroll', look, { passive: true });
    return () => {
      observer.disconnect();
      element.removeEventListener('scroll', look);
    };
  }, [ref, isWanted]);
  return view;
}
