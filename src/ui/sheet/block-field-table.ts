/** Which fields each kind of block shows, the value first since it is what is changed most, and the edits that keep them. */

import { type Block, displayName, type Edit } from '../../diagram/index.ts';

export interface BlockField {
  readonly field: string;
  readonly label: string;
  readonly text: string;
}

/** The block's fields with their present texts, in the order they are shown. */
export function fieldsOf(block: Block): readonly BlockField[] {
  return [...valueFields(block), { field: 'note', label: 'note', text: block.note ?? '' }];
}

/** Edits for the fields whose text differs from the present one; none where nothing was changed. */
export function fieldEdits(block: Block, written: (field: string) => string): readonly Edit[] {
  return fieldsOf(block).flatMap(({ field, text }): readonly Edit[] => {
    const value = written(field).trim();
    if (value === text) return [];
    if (field === 'name') return [{ kind: 'renameBlock', id: block.id, name: value }];
    return [{ kind: 'setField', id: block.id, field, value }];
  });
}

function valueFields(block: Block): readonly BlockField[] {
  const name = { field: 'name', label: 'name', text: displayName(block) };
  switch (block.kind) {
    case 'input':
    case 'output':
      return [name, { field: 'unit', label: 'unit', text: block.unit ?? '' }];
    case 'gain':
      return [{ field: 'gain', label: 'gain', text: block.gain }, name];
    case 'summer':
      return [{ field: 'signs', label: 'signs', text: block.signs }, name];
    case 'integrator':
      return [
        { ...name, label: 'state' },
        { field: 'initial', label: 'initial value', text: block.initial ?? '0' },
        { field: 'unit', label: 'unit', text: block.unit ?? '' },
      ];
    case 'transfer-function':
      return [
        { field: 'numerator', label: 'numerator', text: block.numerator },
        { field: 'denominator', label: 'denominator', text: block.denominator },
        name,
      ];
    case 'delay':
      return [
        { field: 'time', label: 'dead time / s', text: block.time },
        { field: 'order', label: 'Padé order', text: String(block.order ?? 2) },
        name,
      ];
    case 'limiter':
      return [
        { field: 'lower', label: 'lower limit', text: block.lower },
        { field: 'upper', label: 'upper limit', text: block.upper },
        name,
      ];
    case 'differentiator':
    case 'state-model':
    case 'group':
      return [name];
    default:
      return unreachable(block);
  }
}

function unreachable(block: never): never {
  throw new Error(`a block of no known kind: ${JSON.stringify(block)}`);
}
