/** From what the user named (a file, a share link, standard input) to the drawing. */

import { type Diagram, readDiagram } from '../diagram/index.ts';
import type { Result } from '../problem/index.ts';
import { decodeLink, isLink } from '../share/index.ts';
import type { Io } from './io.ts';

/** The drawing that `source` names; the refusal of whichever step could not be done. */
export async function readDrawing(source: string, io: Io): Promise<Result<Diagram>> {
  if (source !== '-' && isLink(source)) return decodeLink(source);
  const text = source === '-' ? await io.readStandardInput() : await io.readFile(source);
  return text.ok ? readDiagram(text.value) : text;
}
