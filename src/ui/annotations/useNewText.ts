/** A double click on empty paper begins a text there; what shows and takes it is loaded by then. */

import { useEffect } from 'react';
import { placeOf } from '../sheet/pointer.ts';
import { beginText } from './annotation-commands.ts';

export function useNewText(): void {
  useEffect(() => {
    void import('./AnnotationLayer.tsx');
    const onDoubleClick = ({ target, clientX, clientY }: MouseEvent) => {
      if (target instanceof Element && target.classList.contains('react-flow__pane')) {
        beginText(placeOf(clientX, clientY));
      }
    };
    window.addEventListener('dblclick', onDoubleClick);
    return () => window.removeEventListener('dblclick', onDoubleClick);
  }, []);
}
