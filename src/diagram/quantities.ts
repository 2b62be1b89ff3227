/** Where a drawing holds arithmetic as text: one list for checking, renaming and finding what uses a parameter. */

import type { Block, Quantity } from './types.ts';

/** One text of a block that is an expression. */
export interface QuantityField {
  /** Its name as in the file: `gain`, `denominator`, `A`. */
  readonly field: string;
  readonly text: Quantity;
  /** Whether it is a polynomial in s. */
  readonly isPolynomial: boolean;
}

/** The expressions of a block in the order of its fields; those inside a group's sheet are not the group's own. */
export function quantityFields(block: Block): readonly QuantityField[] {
  const found: QuantityField[] = [];
  mapQuantities(block, (text, field) => {
    found.push({ field, text, isPolynomial: field === 'numerator' || field === 'denominator' });
    return text;
  });
  return found;
}

type Change = (text: Quantity, field: string) => Quantity;

/** The block with each of its own expressions changed; the same object where none is. */
export function mapQuantities(block: Block, change: Change): Block {
  switch (block.kind) {
    case 'gain':
      return withField(block, 'gain', change(block.gain, 'gain'));
    case 'integrator':
      return block.initial === undefined ? block : withField(block, 'initial', change(block.initial, 'initial'));
    case 'transfer-function': {
      const changed = withField(block, 'numerator', change(block.numerator, 'numerator'));
      return withField(changed, 'denominator', change(block.denominator, 'denominator'));
    }
    case 'delay':
      return withField(block, 'time', change(block.time, 'time'));
    case 'limiter': {
      const changed = withField(block, 'lower', change(block.lower, 'lower'));
      return withField(changed, 'upper', change(block.upper, 'upper'));
    }
    case 'state-model':
      return mapStateModel(block, change);
    case 'input':
    case 'output':
    case 'summer':
    case 'differentiator':
    case 'group':
      return block;
    default:
      return block satisfies never;
  }
}

function withField<B extends Block, K extends keyof B>(block: B, field: K, value: B[K]): B {
  return block[field] === value ? block : { ...block, [field]: value };
}

const MATRICES = ['A', 'B', 'C', 'D'] as const;

function mapStateModel(block: Extract<Block, { kind: 'state-model' }>, change: Change): Block {
  let changed = block;
  for (const matrix of MATRICES) {
    const rows = keepSame(block[matrix], row => keepSame(row, text => change(text, matrix)));
    changed = withField(changed, matrix, rows);
  }
  if (block.initial === undefined) return changed;
  return withField(
    changed,
    'initial',
    keepSame(block.initial, text => change(text, 'initial')),
  );
}

/** `map`, but the same array where nothing changes. */
export function keepSame<T>(items: readonly T[], change: (item: T) => T): readonly T[] {
  const changed = items.map(change);
  return changed.every((item, i) => item === items[i]) ? items : changed;
}
