/** Where the pointer is over the sheet, in the sheet's own units, for what has to go there: a paste, a written block. */

import type { Point } from '../../diagram/index.ts';

type Converter = (clientX: number, clientY: number) => Point;

let convert: Converter = (x, y) => [x, y];
let last: readonly [clientX: number, clientY: number] | null = null;

export function setConverter(converter: Converter): void {
  convert = converter;
}

/** A place of the window as one of the sheet. */
export function placeOf(clientX: number, clientY: number): Point {
  return convert(clientX, clientY);
}

/** Remembers where the pointer is; null once it has left the sheet. */
export function setPointer(place: readonly [clientX: number, clientY: number] | null): void {
  last = place;
}

/** Where the pointer is on the sheet; null while it is elsewhere. */
export function pointerPlace(): Point | null {
  return last === null ? null : convert(last[0], last[1]);
}
