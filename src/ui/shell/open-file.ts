/** A drawing's file read from disk and opened as a new drawing; what cannot be read changes nothing. */

import { MAXIMUM_BYTES, readDiagram } from '../../diagram/index.ts';
import { actions } from '../store/index.ts';
import { newKey } from './new-key.ts';

export async function openFile(file: File): Promise<boolean> {
  if (file.size > MAXIMUM_BYTES) return refuse(`${file.name} is larger than 4 MiB, which no drawing may be.`);
  let text: string;
  try {
    text = await file.text();
  } catch {
    return refuse(`${file.name} cannot be read.`);
  }
  const read = readDiagram(text);
  if (!read.ok) return refuse(`${file.name}: ${read.problems[0]?.message ?? 'not a drawing.'}`);
  actions.openDrawing(read.value, newKey(), `Opened ${file.name}.`);
  return true;
}

function refuse(message: string): false {
  actions.notify(message, 'refused');
  return false;
}
