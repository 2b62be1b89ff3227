/** Opens a drawing's file that is dropped anywhere on the page. */

import type { DragEvent } from 'react';
import { openFile } from './open-file.ts';

interface FileDrop {
  readonly onDragOver: (event: DragEvent) => void;
  readonly onDrop: (event: DragEvent) => void;
}

const DROP: FileDrop = {
  onDragOver: event => {
    if (event.dataTransfer.types.includes('Files')) event.preventDefault();
  },
  onDrop: event => {
    const file = event.dataTransfer.files[0];
    if (file === undefined) return;
    event.preventDefault();
    void openFile(file);
  },
};

export function useFileDrop(): FileDrop {
  return DROP;
}
