/** What the drawing's quantities come to, for the small type under a symbol and beside a parameter. */

import type { Block, Diagram } from '../diagram/index.ts';
import { evaluateParameters, evaluateQuantity, type Scope } from '../expression/index.ts';
import type { QuantityValues } from './protocol.ts';

/** Doubles by parameter name and by block id of the top sheet; what cannot be evaluated is left out. */
export function quantityValues({ parameters, blocks }: Diagram): QuantityValues {
  const scope = evaluateParameters(parameters);
  if (!scope.ok) return { parameters: {}, blocks: {} };
  const values = new Map<string, number>();
  for (const block of blocks) {
    const value = blockValue(block, scope.value);
    if (value !== null) values.set(block.id, value);
  }
  const named = [...scope.value].map(([name, { double }]) => [name, double] as const);
  return { parameters: Object.fromEntries(named), blocks: Object.fromEntries(values) };
}

function blockValue(block: Block, scope: Scope): number | null {
  const written = block.kind === 'gain' ? block.gain : block.kind === 'delay' ? block.time : null;
  if (written === null) return null;
  const value = evaluateQuantity(written, scope);
  return value.ok ? value.value.double : null;
}
