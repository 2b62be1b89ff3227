/** Wires of a worked drawing as `source target` or `source target port`, from output 0; the router finds their ways. */

import type { Wire } from '../types.ts';

/** One wire a text, in order. */
export function wired(...texts: readonly string[]): readonly Wire[] {
  return texts.map(text => {
    const [from = '', to = '', port = '0'] = text.split(' ');
    return { from: [from, 0], to: [to, Number(port)] };
  });
}
