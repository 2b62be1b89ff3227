/**
 * The lines of the page of keys that no table of keys holds: what fields, tables, plots and lists take while the focus is in them,
 * what the browser does with the sheet, and what the hand does. A test compares the first with the files that handle them.
 */

export interface KeyLine {
  readonly shown: string;
  readonly does: string;
}

/** What only counts while the focus is in something, by what that is. */
export const KEYS_IN_FIELDS: Readonly<Record<string, readonly KeyLine[]>> = {
  'In the write-a-block line': [
    { shown: 'Enter', does: 'place the block, or take the marked name' },
    { shown: 'Tab  ↓  ↑', does: 'complete the name of a parameter, or of a block after @' },
    { shown: 'Escape', does: 'close the list of names, then leave the line' },
    { shown: 'K = 3.5', does: 'a gain with its value' },
    { shown: '@sum-', does: 'a wire to the block sum with minus' },
    { shown: '"', does: 'a text in quotes goes onto the sheet' },
  ],
  'In a field': [
    { shown: 'Enter', does: 'keep what is written' },
    { shown: 'Shift+Enter', does: 'begin a line in a text on the sheet' },
    { shown: 'Escape', does: 'bring back what was there' },
    { shown: '↓  ↑', does: 'go through what was found' },
  ],
  'On a slider': [
    { shown: '←  →  ↑  ↓', does: 'move the value finely, with Shift coarsely' },
    { shown: 'Home  End', does: 'to the ends of its range' },
    { shown: 'Enter  double click', does: 'change its range' },
    { shown: 'Escape', does: 'bring the value back' },
  ],
  'In tabs, in the matrix and on plots': [
    { shown: '←  →  ↑  ↓', does: 'from tab to tab, from entry to entry, along a curve, from pole to pole' },
    { shown: 'Home  End', does: 'to the first and the last' },
    { shown: 'PageUp  PageDown', does: 'to the ends of a column of the matrix, along a curve in great steps' },
    { shown: 'Enter  click', does: 'keep the entry of the matrix whose action paths are lit up' },
    { shown: 'Escape', does: 'let go of what is pointed at' },
  ],
};

/** What the browser and the hand do, by the group of the page that it stands in. */
export const OTHER_WAYS: Readonly<Record<string, readonly KeyLine[]>> = {
  'Place a block': [
    { shown: 'drag', does: 'a part from the row of parts onto the sheet, or onto a wire to put it in' },
  ],
  'On the sheet': [
    { shown: 'Tab  Shift+Tab', does: 'into the sheet, then from block to block' },
    { shown: 'Ctrl+C  Ctrl+X  Ctrl+V', does: 'copy, cut, paste: as a drawing in text, from window to window' },
    { shown: 'Alt+drag', does: 'pull a block out of its wires' },
    { shown: 'Shift+drag', does: 'select by a frame' },
  ],
  'On a wire': [
    { shown: 'drag', does: 'draw a branch; from the arrowhead, move that end' },
    { shown: 'double click', does: 'take its bends out' },
  ],
  'Texts and frames': [{ shown: 'double click', does: 'on paper, write a text; on a text or frame, write it anew' }],
  See: [{ shown: 'wheel  pinch', does: 'zoom the sheet' }],
  Everywhere: [{ shown: 'Ctrl+P', does: 'print' }],
};
