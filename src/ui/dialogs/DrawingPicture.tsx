/** A small picture of a drawing, read and drawn once the row comes into view. */

import { useEffect, useRef, useState } from 'react';
import { sheetSvg } from '../../deliver/sheet-svg/index.ts';
import { type Diagram, readDiagram } from '../../diagram/index.ts';

interface DrawingPictureProps {
  /** The drawing, or what reads it; null where it cannot be had. */
  readonly source: Diagram | (() => Promise<Diagram | null>);
}

/** Drawings of more blocks are told by their titles: routing them would hold up the list. */
const MOST_BLOCKS = 400;

export function DrawingPicture({ source }: DrawingPictureProps) {
  const frame = useRef<HTMLDivElement>(null);
  const read = useRef(source);
  const [address, setAddress] = useState<string | null>(null);
  useEffect(() => {
    let isGone = false;
    let made: string | null = null;
    const show = async () => {
      const diagram = typeof read.current === 'function' ? await read.current() : read.current;
      if (isGone || diagram === null || diagram.blocks.length > MOST_BLOCKS) return;
      made = URL.createObjectURL(new Blob([sheetSvg(diagram, { titleBlock: false })], { type: 'image/svg+xml' }));
      setAddress(made);
    };
    const watcher = new IntersectionObserver(entries => {
      if (!entries.some(({ isIntersecting }) => isIntersecting)) return;
      watcher.disconnect();
      void show();
    });
    if (frame.current !== null) watcher.observe(frame.current);
    return () => {
      isGone = true;
      watcher.disconnect();
      if (made !== null) URL.revokeObjectURL(made);
    };
  }, []);
  return (
    <div ref={frame} className="drawing-picture">
      {address !== null && <img src={address} alt="" />}
    </div>
  );
}

/** The drawing that a text holds, null where it cannot be read. */
export function diagramOf(text: string | null): Diagram | null {
  const read = text === null ? null : readDiagram(text);
  return read?.ok === true ? read.value : null;
}
