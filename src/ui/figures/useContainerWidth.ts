import { type RefObject, useLayoutEffect, useRef, useState } from 'react';

/** Width of an element's content box in whole CSS pixels, followed as it changes; 0 before it is laid out. */
export function useContainerWidth<T extends HTMLElement>(): {
  readonly ref: RefObject<T | null>;
  readonly width: number;
} {
  const ref = useRef<T>(null);
  const [width, setWidth] = useState(0);
  useLayoutEffect(() => {
    const container = ref.current;
    if (container === null) return;
    const style = getComputedStyle(container);
    const padding = Number.parseFloat(style.paddingLeft) + Number.parseFloat(style.paddingRight);
    // Measured before the first paint, so that nothing jumps when the observer reports.
    setWidth(Math.floor(container.clientWidth - padding));
    const observer = new ResizeObserver(entries => {
      const box = entries.at(-1)?.contentRect;
      if (box !== undefined) setWidth(Math.floor(box.width));
    });
    observer.observe(container);
    return () => observer.disconnect();
  }, []);
  return { ref, width };
}
