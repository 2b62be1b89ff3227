/** The findings about the structure as sentences. */

import type { StructuralMode, StructureReport } from '../../analysis/minimal/index.ts';
import { rootText } from '../figures/index.ts';

/** What is controllable, observable and enough, in one or two sentences. */
export function structureSentence({ states, reached, seen, minimal }: StructureReport): string {
  if (states === 0) return 'The model has no states.';
  const reach =
    reached === states ? 'The inputs reach every state' : `The inputs reach ${reached} of ${states} dimensions`;
  const show =
    seen === states ? 'the outputs tell all states apart' : `the outputs tell ${seen} of ${states} dimensions apart`;
  const controllable = reached === states ? 'controllable' : 'not controllable';
  const observable = seen === states ? 'observable' : 'not observable';
  const size =
    minimal === states
      ? `The model is minimal: no fewer than ${count(states)} will do.`
      : `${capital(count(minimal))} would do for the same transfer functions.`;
  return `${reach} (${controllable}) and ${show} (${observable}). ${size}`;
}

/** `−2`, `−1 ± 2j, 2 times`. */
export function modeText(mode: StructuralMode): string {
  const times = mode.multiplicity === 1 ? '' : `, ${mode.multiplicity} times`;
  return `${rootText({ ...mode, isPair: mode.im > 0 })}${times}`;
}

/** Why the mode is hidden. */
export function modeReason({ isUncontrollable, isUnobservable }: StructuralMode): string {
  if (isUncontrollable && isUnobservable) return 'no input reaches it, no output shows it';
  if (isUncontrollable) return 'no input reaches it';
  return isUnobservable ? 'no output shows it' : 'no input and output share it';
}

function count(states: number): string {
  return states === 0 ? 'no state' : states === 1 ? '1 state' : `${states} states`;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
