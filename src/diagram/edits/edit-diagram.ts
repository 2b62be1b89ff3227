/**
 * The one function that changes documents: (diagram, edit) to the diagram after it. What did not change keeps its identity,
 * and the result is always one that `readDiagram` accepts.
 */

import { fail, ok, problem, type Result } from '../../problem/index.ts';
import { DEEPEST_GROUP, MOST_BLOCKS } from '../limits.ts';
import { beginReading, noteNameClashes } from '../reading/index.ts';
import type { Diagram, Sheet } from '../types.ts';
import { addAnnotations, moveAnnotations, removeAnnotations, setAnnotation } from './annotation-edits.ts';
import {
  addBlock,
  addBlocks,
  mirrorBlocks,
  moveBlocks,
  placeBlocks,
  removeBlocks,
  removeBlocksHealing,
  renameBlock,
  reorderBlock,
} from './block-edits.ts';
import { addCut, removeCut, withCutsOnWires } from './cut-edits.ts';
import type { Edit, SheetEdit } from './edit.ts';
import { setField, setMatrices } from './field-edits.ts';
import { foldBlocks, unfoldGroup } from './group-edits.ts';
import {
  addParameter,
  removeParameter,
  renameParameter,
  reorderParameters,
  setParameter,
  setTitleFields,
} from './parameter-edits.ts';
import { addRequirement, removeRequirement, setRequirement, withRequirementsOnNames } from './requirement-edits.ts';
import { changeSheet } from './sheets.ts';
import { connect, disconnect, insertOnWire, moveWireEnd, nameWire, setVia } from './wire-edits.ts';

/** The diagram after the edit: the same object where it changes nothing, the problems where it is refused. */
export function editDiagram(diagram: Diagram, edit: Edit): Result<Diagram> {
  switch (edit.kind) {
    case 'addParameter':
      return addParameter(diagram, edit);
    case 'removeParameter':
      return removeParameter(diagram, edit);
    case 'renameParameter':
      return renameParameter(diagram, edit);
    case 'setParameter':
      return setParameter(diagram, edit);
    case 'reorderParameters':
      return reorderParameters(diagram, edit);
    case 'setTitleFields':
      return setTitleFields(diagram, edit);
    case 'addCut':
      return addCut(diagram, edit);
    case 'removeCut':
      return removeCut(diagram, edit);
    case 'addRequirement':
      return addRequirement(diagram, edit);
    case 'setRequirement':
      return setRequirement(diagram, edit);
    case 'removeRequirement':
      return removeRequirement(diagram, edit);
    default:
      return onSheet(diagram, edit);
  }
}

function onSheet(diagram: Diagram, edit: SheetEdit): Result<Diagram> {
  const changed = changeSheet(diagram, edit.at ?? [], sheet => editSheet(sheet, edit));
  if (!changed.ok || changed.value === diagram) return changed;
  const whole = withRequirementsOnNames(diagram, withCutsOnWires(changed.value, edit));
  return CAN_CLASH.has(edit.kind) ? checked(whole) : ok(whole);
}

/** Edits that can bring a name twice or a block too many. */
const CAN_CLASH: ReadonlySet<SheetEdit['kind']> = new Set([
  'addBlock',
  'addBlocks',
  'insertOnWire',
  'foldBlocks',
  'unfoldGroup',
  'renameBlock',
  'setField',
  'setMatrices',
]);

function checked(diagram: Diagram): Result<Diagram> {
  if (countBlocks(diagram) > MOST_BLOCKS) {
    return fail(problem('too-large', `A drawing has at most ${MOST_BLOCKS} blocks. Remove some first.`));
  }
  if (groupDepth(diagram) > DEEPEST_GROUP) {
    return fail(problem('too-large', `Groups go ${DEEPEST_GROUP} deep at most. Put it on a sheet further up.`));
  }
  const reading = beginReading();
  noteNameClashes(diagram, reading);
  return reading.problems.length === 0 ? ok(diagram) : { ok: false, problems: reading.problems };
}

/** Recursion is as deep as groups are: at most 32, and as much again while a deep one is being put in. */
function countBlocks(sheet: Sheet): number {
  return sheet.blocks.reduce((sum, block) => sum + 1 + (block.kind === 'group' ? countBlocks(block.sheet) : 0), 0);
}

/** How many groups stand inside one another. Recursion as in `countBlocks`. */
function groupDepth(sheet: Sheet): number {
  return sheet.blocks.reduce(
    (most, block) => (block.kind === 'group' ? Math.max(most, 1 + groupDepth(block.sheet)) : most),
    0,
  );
}

function editSheet(sheet: Sheet, edit: SheetEdit): Result<Sheet> {
  switch (edit.kind) {
    case 'addBlock':
      return addBlock(sheet, edit);
    case 'addBlocks':
      return addBlocks(sheet, edit);
    case 'moveBlocks':
      return moveBlocks(sheet, edit);
    case 'placeBlocks':
      return placeBlocks(sheet, edit);
    case 'removeBlocks':
      return removeBlocks(sheet, edit);
    case 'removeBlocksHealing':
      return removeBlocksHealing(sheet, edit);
    case 'mirrorBlocks':
      return mirrorBlocks(sheet, edit);
    case 'reorderBlock':
      return reorderBlock(sheet, edit);
    case 'renameBlock':
      return renameBlock(sheet, edit);
    case 'setField':
      return setField(sheet, edit);
    case 'setMatrices':
      return setMatrices(sheet, edit);
    case 'connect':
      return connect(sheet, edit);
    case 'disconnect':
      return disconnect(sheet, edit);
    case 'moveWireEnd':
      return moveWireEnd(sheet, edit);
    case 'setVia':
      return setVia(sheet, edit);
    case 'nameWire':
      return nameWire(sheet, edit);
    case 'insertOnWire':
      return insertOnWire(sheet, edit);
    case 'foldBlocks':
      return foldBlocks(sheet, edit);
    case 'unfoldGroup':
      return unfoldGroup(sheet, edit);
    case 'addAnnotations':
      return addAnnotations(sheet, edit);
    case 'removeAnnotations':
      return removeAnnotations(sheet, edit);
    case 'moveAnnotations':
      return moveAnnotations(sheet, edit);
    case 'setAnnotation':
      return setAnnotation(sheet, edit);
    default:
      return edit satisfies never;
  }
}
