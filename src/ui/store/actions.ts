/**
 * Everything a hand can do to the page, by name. An action writes its own slice; a refused edit changes nothing and says
 * why in the notice.
 */

import type { Diagram, Edit, Point, Sheet } from '../../diagram/index.ts';
import type { Problem } from '../../problem/index.ts';
import type { Notation, RevisionAnswer, TraceAnswer } from '../../worker/index.ts';
import { advanced, type DocumentSlice, edited, opened, redone, undone } from './document.ts';
import { moved } from './live.ts';
import { entryLeft, entryPointed, type PointedPart, type PointingSlice } from './pointing.ts';
import { answered } from './results.ts';
import { NOTHING_SELECTED, type SelectionSlice, stillThere } from './selection.ts';
import { store } from './store.ts';
import type { TolerancesSlice } from './tolerances.ts';
import type { ViewSlice } from './view.ts';

/** Makes one edit, one undo step. Returns the problems where it is refused, none where it is done. */
export function edit(change: Edit, said?: string): readonly Problem[] {
  settleParameter();
  const outcome = edited(store.getState().document, change);
  if (!outcome.ok) {
    notify(outcome.problems[0]?.message ?? 'That edit is not possible.', 'refused');
    return outcome.problems;
  }
  replaceDocument(outcome.slice);
  if (said !== undefined) notify(said);
  return [];
}

/** Makes several edits as one undo step, or none of them. */
export function editTogether(changes: readonly Edit[], said?: string): readonly Problem[] {
  settleParameter();
  const start = store.getState().document;
  let slice = start;
  for (const change of changes) {
    const outcome = edited(slice, change);
    if (!outcome.ok) {
      notify(outcome.problems[0]?.message ?? 'That edit is not possible.', 'refused');
      return outcome.problems;
    }
    slice = outcome.slice;
  }
  if (slice !== start) {
    replaceDocument({ ...slice, past: [...start.past, start.diagram], revision: start.revision + 1 });
  }
  if (said !== undefined) notify(said);
  return [];
}

/** Whatever edits `work` makes are one undo step. */
export function asOneStep(work: () => void): void {
  const start = store.getState().document;
  work();
  const { document } = store.getState();
  if (document.revision <= start.revision + 1 || document.key !== start.key) return;
  store.setState({ document: { ...document, past: [...start.past, start.diagram] } });
}

/** Shows a parameter at another value while the hand moves it; no undo step. */
export function moveParameter(name: string, value: string): void {
  if (store.getState().live?.name !== name) settleParameter();
  store.setState(({ document, live }) => ({ live: moved(document, live, name, value) }));
}

/** Makes the value that a moved parameter has come to one edit, one undo step. */
export function settleParameter(): void {
  const { live, document } = store.getState();
  if (live === null) return;
  const outcome = edited(document, { kind: 'setParameter', name: live.name, value: live.value });
  const slice = outcome.ok ? outcome.slice : document;
  store.setState({ live: null, document: { ...slice, revision: document.revision + 1 } });
  if (!outcome.ok) notify(outcome.problems[0]?.message ?? 'That value is not possible.', 'refused');
  else if (slice !== document) notify(`${live.name} = ${live.value}.`);
}

/** Brings a moved parameter back to where it was. */
export function returnParameter(): void {
  const { live, document } = store.getState();
  if (live === null) return;
  store.setState({ live: null, document: { ...document, revision: document.revision + 1 } });
}

export function undo(): void {
  settleParameter();
  const { document } = store.getState();
  if (document.past.length === 0) return notify('Nothing to undo.');
  replaceDocument(undone(document));
  notify('Undone.');
}

export function redo(): void {
  settleParameter();
  const { document } = store.getState();
  if (document.future.length === 0) return notify('Nothing to redo.');
  replaceDocument(redone(document));
  notify('Redone.');
}

/** Puts another drawing on the sheet, with places for blocks that have none; what was open stays kept under its own key. */
export function openDrawing(diagram: Diagram, key: string, said: string): void {
  if (hasUnplaced(diagram)) return void placed(diagram).then(complete => openDrawing(complete, key, said));
  settleParameter();
  store.setState(state => ({
    document: opened(state.document, diagram, key),
    selection: NOTHING_SELECTED,
    view: { ...state.view, editing: null, writingAt: null, finding: false, input: null, output: null, kept: null },
  }));
  notify(said);
}

/** Whether a block, of a group's sheet too, has no place yet. */
function hasUnplaced({ blocks }: Sheet): boolean {
  return blocks.some(block => block.at === undefined || (block.kind === 'group' && hasUnplaced(block.sheet)));
}

/** The drawing with a place for each block; what finds the places is loaded when a drawing first needs it. */
async function placed(diagram: Diagram): Promise<Diagram> {
  const { placeUnplaced } = await import('../../diagram/arranging/index.ts');
  return placeUnplaced(diagram);
}

/** Goes on with what is on the sheet as another drawing, under a key of its own and a title that says why. */
export function goOnAsCopy(key: string, said: string): void {
  store.setState(({ document }) => {
    const title = `${document.diagram.title || 'untitled'} (from another tab)`;
    return { document: { ...document, key, diagram: { ...document.diagram, title }, revision: document.revision + 1 } };
  });
  notify(said, 'refused');
}

/** Makes a former version the newest document, one undo step. */
export function returnTo(diagram: Diagram, said: string): void {
  settleParameter();
  replaceDocument(advanced(store.getState().document, diagram));
  notify(said);
}

export function select(selection: SelectionSlice): void {
  store.setState({ selection });
}

export function selectBlocks(ids: Iterable<string>): void {
  store.setState({ selection: { blocks: new Set(ids), wires: new Set() } });
}

export function selectAnnotations(ids: Iterable<string>): void {
  store.setState({ selection: { ...NOTHING_SELECTED, annotations: new Set(ids) } });
}

/** Opens a text or frame for writing, or closes what is open. */
export function annotate(annotating: ViewSlice['annotating']): void {
  changeView(annotating === undefined ? {} : { annotating });
}

/** Shows blocks where the hand has them while a drag lasts. */
export function hold(held: ReadonlyMap<string, Point> | null): void {
  store.setState({ held });
}

/** Opens the fields of a block on the sheet, or closes them. */
export function editFields(editing: string | null): void {
  changeView({ editing });
}

/** Begins a wire by key from a block, or lets go of it. */
export function beginWire(wiringFrom: string | null): void {
  changeView({ wiringFrom });
}

/** Says where the next written block goes and what is wired to it. */
export function beginWritingAt(writingAt: ViewSlice['writingAt']): void {
  changeView({ writingAt });
}

/** Opens or closes the field that finds blocks. */
export function openFinding(finding: boolean): void {
  changeView({ finding });
}

export function setNotation(notation: Notation): void {
  changeView({ notation });
}

/** Writes derived parameters out in symbols, or lets them keep their names. */
export function setExpanded(expanded: boolean): void {
  changeView({ expanded });
}

export function setTheme(theme: ViewSlice['theme']): void {
  changeView({ theme });
}

export function chooseChannel(input: string, output: string): void {
  changeView({ input, output });
}

/** Opens a tab under the system matrix. */
export function openResultTab(resultTab: string): void {
  changeView({ resultTab });
}

export function foldTitleBlock(folded: boolean): void {
  changeView({ folded });
}

/** The title block has come onto the sheet. */
export function showTitleBlock(): void {
  changeView({ hasTitleBlock: true });
}

export function openDialog(dialog: ViewSlice['dialog']): void {
  changeView({ dialog });
}

export function setKept(kept: ViewSlice['kept']): void {
  changeView({ kept });
}

/** Says what was done or refused. */
export function notify(text: string, tone: 'said' | 'refused' = 'said'): void {
  store.setState(({ view }) => ({ view: { ...view, notice: { text, tone, serial: (view.notice?.serial ?? 0) + 1 } } }));
}

/** Takes an answer of the worker in. */
export function takeAnswer(answer: RevisionAnswer): void {
  store.setState(({ results }) => ({ results: answered(results, answer) }));
}

/** Says that no answer can be had. */
export function stopResults(stopped: string): void {
  store.setState(({ results }) => ({ results: { ...results, stopped } }));
}

/** Points at an entry of the system matrix, or keeps it. */
export function pointAtEntry(row: number, column: number, by: PointingSlice['by']): void {
  store.setState(({ pointing }) => ({ pointing: entryPointed(pointing, row, column, by) }));
}

/** The pointer or the focus has left the entries, or Escape was pressed. */
export function leaveEntry(by: 'hover' | 'walk' | 'escape'): void {
  store.setState(({ pointing }) => ({ pointing: entryLeft(pointing, by) }));
}

/** Points at a block or wire, or at none. */
export function pointAtPart(part: PointedPart | null): void {
  store.setState(({ pointing }) => ({ pointing: { ...pointing, part } }));
}

/** Marks the blocks of hidden modes, or none. */
export function markHidden(hidden: readonly string[]): void {
  store.setState(({ pointing }) => ({ pointing: { ...pointing, hidden } }));
}

/** Takes in what the worker said of what is pointed at. */
export function showTrace(answer: TraceAnswer | null): void {
  store.setState(({ pointing }) => ({ pointing: { ...pointing, answer } }));
}

/** Takes in how far a judgement over tolerances has come, or what it found. */
export function setTolerances(tolerances: TolerancesSlice | null): void {
  store.setState({ tolerances });
}

function changeView(change: Partial<ViewSlice>): void {
  store.setState(({ view }) => ({ view: { ...view, ...change } }));
}

function replaceDocument(document: DocumentSlice): void {
  store.setState(({ selection, view }) => ({
    document,
    selection: stillThere(selection, document.diagram),
    view: document.diagram.blocks.some(({ id }) => id === view.editing) ? view : { ...view, editing: null },
  }));
}
