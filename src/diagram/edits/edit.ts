/** Every change that a hand can make to a drawing, as plain data. */

import type { Requirement } from '../requirements/index.ts';
import type { Annotation, Block, Parameter, Point, PortReference, Quantity, Wire } from '../types.ts';

/** Ids of the groups that lead to a sheet, outermost first; the top sheet where it is empty. */
export type SheetPath = readonly string[];

/** The sheet that an edit is for; the top one where it is absent. */
interface OnSheet {
  readonly at?: SheetPath;
}

/** A new block at the end of the sheet's order. */
export interface AddBlock extends OnSheet {
  readonly kind: 'addBlock';
  readonly block: Block;
}
/** Copies of blocks and of the wires between them, under fresh ids and names, at the end of the sheet's order. */
export interface AddBlocks extends OnSheet {
  readonly kind: 'addBlocks';
  readonly blocks: readonly Block[];
  /** Ids as in `blocks`. */
  readonly wires: readonly Wire[];
  /** Moves the copies, sheet units. */
  readonly dx?: number;
  readonly dy?: number;
}
/** Moves blocks, and the bend points of the wires between them. */
export interface MoveBlocks extends OnSheet {
  readonly kind: 'moveBlocks';
  readonly ids: readonly string[];
  /** Sheet units. */
  readonly dx: number;
  readonly dy: number;
}
/** Gives blocks their places, as arranging does. */
export interface PlaceBlocks extends OnSheet {
  readonly kind: 'placeBlocks';
  readonly places: readonly (readonly [id: string, at: Point])[];
}
/** Removes blocks and the wires at them. */
export interface RemoveBlocks extends OnSheet {
  readonly kind: 'removeBlocks';
  readonly ids: readonly string[];
}
/** Removes blocks; what fed the first wired input of each then feeds what it fed. */
export interface RemoveBlocksHealing extends OnSheet {
  readonly kind: 'removeBlocksHealing';
  readonly ids: readonly string[];
}
/** Turns the signal's direction in blocks round. */
export interface MirrorBlocks extends OnSheet {
  readonly kind: 'mirrorBlocks';
  readonly ids: readonly string[];
}
/** Another place in the order of blocks, which is that of states, inputs and outputs: in front of `before`, or last. */
export interface ReorderBlock extends OnSheet {
  readonly kind: 'reorderBlock';
  readonly id: string;
  readonly before: string | null;
}
/** A display name; blank takes it away, so that the id is shown. */
export interface RenameBlock extends OnSheet {
  readonly kind: 'renameBlock';
  readonly id: string;
  readonly name: string;
}
/** The text of one field, named as in the file; blank takes an optional field away. */
export interface SetField extends OnSheet {
  readonly kind: 'setField';
  readonly id: string;
  readonly field: string;
  readonly value: string;
}
/** The matrices of a state model, together since their sizes depend on one another. */
export interface SetMatrices extends OnSheet {
  readonly kind: 'setMatrices';
  readonly id: string;
  readonly A: readonly (readonly Quantity[])[];
  readonly B: readonly (readonly Quantity[])[];
  readonly C: readonly (readonly Quantity[])[];
  readonly D: readonly (readonly Quantity[])[];
  /** Zeros where absent. */
  readonly initial?: readonly Quantity[];
}
/** A wire; one that leads to the same input port already is an obstacle, or goes where `replace` is true. */
export interface Connect extends OnSheet {
  readonly kind: 'connect';
  readonly from: PortReference;
  readonly to: PortReference;
  readonly replace?: boolean;
  readonly name?: string;
  readonly via?: readonly Point[];
}
/** Removes the wire to an input port. */
export interface Disconnect extends OnSheet {
  readonly kind: 'disconnect';
  readonly to: PortReference;
}
/** Moves the ends of the wire to an input port; its bend points go. */
export interface MoveWireEnd extends OnSheet {
  readonly kind: 'moveWireEnd';
  readonly to: PortReference;
  readonly newFrom: PortReference;
  readonly newTo: PortReference;
  readonly replace?: boolean;
}
/** The bend points of the wire to an input port; none lets it find its own way. */
export interface SetVia extends OnSheet {
  readonly kind: 'setVia';
  readonly to: PortReference;
  readonly via: readonly Point[];
}
/** The name of the signal on the wire to an input port; blank takes it away. */
export interface NameWire extends OnSheet {
  readonly kind: 'nameWire';
  readonly to: PortReference;
  readonly name: string;
}
/** A new block in the wire to an input port, through its first input and output. */
export interface InsertOnWire extends OnSheet {
  readonly kind: 'insertOnWire';
  readonly to: PortReference;
  readonly block: Block;
}
/** Annotations on top of those of the sheet, under ids of their own. */
export interface AddAnnotations extends OnSheet {
  readonly kind: 'addAnnotations';
  readonly annotations: readonly Annotation[];
  /** Moves them, sheet units. */
  readonly dx?: number;
  readonly dy?: number;
}
export interface RemoveAnnotations extends OnSheet {
  readonly kind: 'removeAnnotations';
  readonly ids: readonly string[];
}
export interface MoveAnnotations extends OnSheet {
  readonly kind: 'moveAnnotations';
  readonly ids: readonly string[];
  /** Sheet units. */
  readonly dx: number;
  readonly dy: number;
}
/** Another text, place or size of an annotation; what is absent stays. */
export interface SetAnnotation extends OnSheet {
  readonly kind: 'setAnnotation';
  readonly id: string;
  readonly text?: string;
  readonly place?: Point;
  readonly size?: readonly [width: number, height: number];
}
export interface AddParameter {
  readonly kind: 'addParameter';
  readonly parameter: Parameter;
  /** Place in the list; last where absent. */
  readonly index?: number;
}
/** What uses it then uses a name that is no parameter, which the model's derivation reports. */
export interface RemoveParameter {
  readonly kind: 'removeParameter';
  readonly name: string;
}
/** In every expression of every block and parameter, in groups too. */
export interface RenameParameter {
  readonly kind: 'renameParameter';
  readonly from: string;
  readonly to: string;
}
/** Fields that are absent stay; blank takes an optional one away. */
export interface SetParameter {
  readonly kind: 'setParameter';
  readonly name: string;
  readonly value?: Quantity;
  readonly unit?: string;
  readonly tolerance?: string;
  readonly note?: string;
  /** Null lets the slider take its range from the value. */
  readonly range?: readonly [low: Quantity, high: Quantity] | null;
}
/** Names in their new order; those not listed follow in the old one. */
export interface ReorderParameters {
  readonly kind: 'reorderParameters';
  readonly names: readonly string[];
}
/** Fields that are absent stay; blank takes an optional one away. */
export interface SetTitleFields {
  readonly kind: 'setTitleFields';
  readonly title?: string;
  readonly notes?: string;
  readonly revision?: string;
  readonly date?: string;
  readonly author?: string;
}

/** A cut on a wire of the top sheet, known by the input port it leads to; last in the list. */
export interface AddCut {
  readonly kind: 'addCut';
  readonly to: PortReference;
}
export interface RemoveCut {
  readonly kind: 'removeCut';
  readonly to: PortReference;
}

/** A requirement at a place in the list, last where none is given. */
export interface AddRequirement {
  readonly kind: 'addRequirement';
  readonly requirement: Requirement;
  readonly index?: number;
}
/** Another requirement in the place of one. */
export interface SetRequirement {
  readonly kind: 'setRequirement';
  readonly index: number;
  readonly requirement: Requirement;
}
export interface RemoveRequirement {
  readonly kind: 'removeRequirement';
  readonly index: number;
}

/** Blocks of a sheet into a group that stands where they stood; `group` with a number where it has no name. */
export interface FoldBlocks extends OnSheet {
  readonly kind: 'foldBlocks';
  readonly ids: readonly string[];
  readonly name?: string;
}
/** What a group holds back onto the sheet. */
export interface UnfoldGroup extends OnSheet {
  readonly kind: 'unfoldGroup';
  readonly id: string;
}

/** An edit of what stands on one sheet. */
export type SheetEdit =
  | AddBlock
  | AddBlocks
  | MoveBlocks
  | PlaceBlocks
  | RemoveBlocks
  | RemoveBlocksHealing
  | MirrorBlocks
  | ReorderBlock
  | RenameBlock
  | SetField
  | SetMatrices
  | Connect
  | Disconnect
  | MoveWireEnd
  | SetVia
  | NameWire
  | InsertOnWire
  | FoldBlocks
  | UnfoldGroup
  | AddAnnotations
  | RemoveAnnotations
  | MoveAnnotations
  | SetAnnotation;

/** An edit of what belongs to the whole drawing. */
export type DrawingEdit =
  | AddParameter
  | RemoveParameter
  | RenameParameter
  | SetParameter
  | ReorderParameters
  | SetTitleFields
  | AddCut
  | RemoveCut
  | AddRequirement
  | SetRequirement
  | RemoveRequirement;

export type Edit = SheetEdit | DrawingEdit;
