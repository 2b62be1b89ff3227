/** Where a drawn wire or a moved end is let go: a port, a block's body, another wire, or empty paper. */

import type { Connection, FinalConnectionState } from 'reactflow';
import { GRID, snap } from '../../diagram/geometry/index.ts';
import type { Point, PortReference, Wire } from '../../diagram/index.ts';
import { wireAt } from '../commands/insert-in-wire.ts';
import { actions } from '../store/index.ts';
import { beginWriting } from '../write-line/begin-writing.ts';
import { connectBlocks, moveWireEnd, type WireTarget } from './connect-blocks.ts';
import { placeOf } from './pointer.ts';
import { endWireGesture, wireGesture } from './wire-gesture.ts';
import { wireOf } from './wire-of.ts';

/** Pixels from its start within which a wire that is let go counts as given up. */
const GIVEN_UP = 24;

/** From a wire's free end to the centre of the block that is written there, sheet units. */
const TO_CENTRE = 2 * GRID;

/** A wire, or the end of one, let go on a port. */
export function connect({ source, sourceHandle, target, targetHandle }: Connection): void {
  const [from, to]: [PortReference, PortReference] = [
    [source, portOf(sourceHandle)],
    [target, portOf(targetHandle)],
  ];
  const moved = movedWire();
  if (moved === undefined) connectBlocks(from, to);
  else moveWireEnd(moved, from, to);
}

/** A wire let go beside any port: on a block's body it goes to its first open port, on paper a block is written for it. */
export function dropDrawnWire(event: MouseEvent | TouchEvent, state: FinalConnectionState): void {
  const moved = movedWire();
  endWireGesture();
  const { isValid, fromHandle, from } = state;
  if (isValid === true || fromHandle === null || from === null) return;
  const here: PortReference = [fromHandle.nodeId, portOf(fromHandle.id)];
  const isFromOutput = fromHandle.type === 'source';
  const [x, y] = clientPlace(event);
  const body = blockUnder(x, y);
  if (body !== null && body !== here[0]) dropOnBlock(here, isFromOutput, body, moved);
  if (body !== null || moved !== undefined || !isOnPaper(x, y)) return;
  const at = placeOf(x, y);
  if (Math.hypot(at[0] - from.x, at[1] - from.y) >= GIVEN_UP) dropOnPaper(here, isFromOutput, at);
}

function dropOnBlock(here: PortReference, isFromOutput: boolean, body: string, moved: Wire | undefined): void {
  const from: PortReference = isFromOutput ? here : [body, 0];
  const to: WireTarget = isFromOutput ? [body, null] : here;
  if (moved === undefined) connectBlocks(from, to);
  else moveWireEnd(moved, from, to);
}

/** From an input, a wire may be let go on another wire, whose output then feeds it; from an output, a block is written. */
function dropOnPaper(here: PortReference, isFromOutput: boolean, at: Point): void {
  if (!isFromOutput) {
    const wire = wireAt(at, null);
    if (wire !== null) connectBlocks(wire.from, here);
    return;
  }
  actions.beginWritingAt({ at: snap([at[0] + TO_CENTRE, at[1]]), from: here });
  actions.notify('Write the block that the wire leads to. Escape lets go of it.');
  beginWriting('');
}

/** The wire whose end is being moved; undefined while a new one is drawn. */
function movedWire(): Wire | undefined {
  const gesture = wireGesture();
  return gesture?.kind === 'end' ? wireOf({ id: gesture.wire }) : undefined;
}

/** The port's number in a handle's id, `in:2`. */
function portOf(handle: string | null | undefined): number {
  return Number(handle?.split(':')[1] ?? 0);
}

function clientPlace(event: MouseEvent | TouchEvent): [number, number] {
  const place = 'changedTouches' in event ? event.changedTouches[0] : event;
  return [place?.clientX ?? 0, place?.clientY ?? 0];
}

function blockUnder(clientX: number, clientY: number): string | null {
  const node = document.elementFromPoint(clientX, clientY)?.closest<HTMLElement>('.react-flow__node');
  return node?.dataset['id'] ?? null;
}

function isOnPaper(clientX: number, clientY: number): boolean {
  return document.elementFromPoint(clientX, clientY)?.closest('.sheet') != null;
}
