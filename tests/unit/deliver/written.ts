/** What a format writes, as text or as bytes, with a check that it is the kind that its table entry says. */

import type { Derivation } from '../../../src/compile/index.ts';
import { FORMATS, type Notation } from '../../../src/deliver/index.ts';
import { type Diagram, emptyDiagram } from '../../../src/diagram/index.ts';

/** A derivation by hand comes without a drawing; the formats ask it for symbols alone, and find none. */
function written(
  id: string,
  derivation: Derivation,
  notation: Notation,
  diagram = emptyDiagram(),
): string | Uint8Array {
  const format = FORMATS.find(each => each.id === id);
  if (format?.scope !== 'model') throw new Error(`no format of the model is called ${id}`);
  const content = format.write({ diagram, derivation, notation });
  if (format.isBinary === (typeof content === 'string'))
    throw new Error(`${id} says the wrong thing of what it writes`);
  return content;
}

export function textIn(
  id: string,
  derivation: Derivation,
  notation: Notation = 'fractions',
  diagram?: Diagram,
): string {
  const content = written(id, derivation, notation, diagram);
  if (typeof content !== 'string') throw new Error(`${id} writes no text`);
  return content;
}

export function bytesIn(id: string, derivation: Derivation): Uint8Array {
  const content = written(id, derivation, 'decimals');
  if (typeof content === 'string') throw new Error(`${id} writes text`);
  return content;
}
