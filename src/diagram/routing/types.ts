/** What the router takes and gives. All coordinates are those of the sheet. */

import type { PortPlace, Side } from '../geometry/index.ts';
import type { Point, Wire } from '../types.ts';

/** One end of a wire: where the port lies on the sheet and which way it looks. */
export type PortEnd = PortPlace;

/** Bend points from the output port to the input port, both included; every piece is horizontal or vertical. */
export type Route = readonly Point[];

export interface WireRoute {
  /** Empty where the wire's block or port is missing. */
  readonly points: Route;
  /** No free way was found: a plain elbow, whatever it runs over. */
  readonly forced: boolean;
}

export interface Routes {
  /** In the order of the sheet's wires. */
  readonly wires: readonly WireRoute[];
  /** Branching points: where wires of one output part. Lines that cross without one are not joined. */
  readonly dots: readonly Point[];
}

/** A wire's key among those of its sheet: an input port takes one wire at most. */
export function wireKey(wire: Wire): string {
  return `${wire.to[0]}:${wire.to[1]}`;
}

/** Whether a port on this side is left or entered horizontally. */
export function isHorizontal(side: Side): boolean {
  return side === 'left' || side === 'right';
}

/** The unit step that leads away from a port. */
export function outward(side: Side): Point {
  switch (side) {
    case 'left':
      return [-1, 0];
    case 'right':
      return [1, 0];
    case 'top':
      return [0, -1];
    case 'bottom':
      return [0, 1];
    default:
      return side satisfies never;
  }
}
