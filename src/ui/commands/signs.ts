/** The signs of a summing point, changed one at a time. */

import type { Sheet, SummerBlock } from '../../diagram/index.ts';

/** The signs with that of one port set; the same text where the port is not there. */
export function withSign(signs: string, port: number, sign: '+' | '-'): string {
  return port < 0 || port >= signs.length ? signs : signs.slice(0, port) + sign + signs.slice(port + 1);
}

/** The port whose wire was drawn last, which is the last one in the document's order; the last port where none is wired. */
export function lastWiredPort({ wires }: Sheet, { id, signs }: SummerBlock): number {
  const last = wires.findLast(({ to }) => to[0] === id);
  return last === undefined ? signs.length - 1 : last.to[1];
}

/** The signs with that of one port turned round. */
export function withSignTurned(signs: string, port: number): string {
  return withSign(signs, port, signs[port] === '-' ? '+' : '-');
}
