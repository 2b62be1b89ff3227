/**
 * Loads what answers the hand once the drawing stands. Where the hand is quicker, what it did is answered as soon as that part
 * is there; afterwards at once, so that nothing is drawn in between.
 */

import { useSyncExternalStore } from 'react';

type Hand = typeof import('./hand.ts').HAND;

let loaded: Hand | null = null;
const listeners = new Set<() => void>();

export async function loadHand(): Promise<Hand> {
  if (loaded !== null) return loaded;
  const { HAND } = await import('./hand.ts');
  loaded = HAND;
  for (const listener of listeners) listener();
  return HAND;
}

/** Acts at once where the part is there, else when it has come. */
export function withHand(act: (hand: Hand) => void): void {
  if (loaded === null) void loadHand().then(act);
  else act(loaded);
}

/** The part for a component that shows something of it; null until it has come. */
export function useHand(): Hand | null {
  return useSyncExternalStore(subscribe, current);
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

function current(): Hand | null {
  return loaded;
}
