/**
 * Keys as tables: a row says what is pressed, what it does and how to do it. Handlers look a pressed key up here and the page of
 * keys is written from the same rows, so that neither can know a key that the other does not.
 */

/** The parts of the page of keys, in its order. */
export type KeyGroup = 'Place a block' | 'On the sheet' | 'On a wire' | 'Texts and frames' | 'See' | 'Everywhere';

export interface KeyRow {
  readonly group: KeyGroup;
  /** Chords, as `chordOf` writes them: `m`, `Delete`, `Shift+ArrowLeft`, `Alt+Shift+c`, `Ctrl+d` (or Cmd). */
  readonly keys: readonly string[];
  /** What it does, for the page. */
  readonly does: string;
  /** Whether it did something; where not, the next row with the same chord is asked. */
  readonly act: (event: KeyPress, fitDrawing: () => void) => boolean;
}

export type KeyPress = Pick<KeyboardEvent, 'key' | 'code' | 'shiftKey' | 'ctrlKey' | 'metaKey' | 'altKey'> & {
  readonly getModifierState?: (modifier: string) => boolean;
};

/**
 * The chord of a pressed key. Shift counts for keys that write nothing, else it is in the character; with Alt the key counts by its
 * place, since Alt changes what some letters write; a character that needs the third level of the keyboard is that character.
 */
export function chordOf(event: KeyPress): string {
  const { key, code, shiftKey, ctrlKey, metaKey, altKey } = event;
  if (event.getModifierState?.('AltGraph') === true && key.length === 1) return key;
  const isControl = ctrlKey || metaKey;
  const isWriting = key.length === 1 && !isControl && !altKey;
  const name = altKey ? code.replace(/^Key/, '').replace(/^[A-Z]$/, letter => letter.toLowerCase()) : key;
  const plain = name.length === 1 && isControl ? name.toLowerCase() : name;
  return `${isControl ? 'Ctrl+' : ''}${altKey ? 'Alt+' : ''}${shiftKey && !isWriting ? 'Shift+' : ''}${plain}`;
}

/** Asks the rows of the pressed key in their order; whether one of them did something. */
export function isDoneBy(rows: readonly KeyRow[], event: KeyPress, fitDrawing: () => void): boolean {
  const chord = chordOf(event);
  return rows.some(({ keys, act }) => keys.includes(chord) && act(event, fitDrawing));
}

const SIGNS: Readonly<Record<string, string>> = {
  ArrowLeft: '←',
  ArrowRight: '→',
  ArrowUp: '↑',
  ArrowDown: '↓',
  ' ': 'Space',
};

/** Characters in a row, at least so many, are shown as the first and the last. */
const LEAST_RUN = 4;

/** Chords as the page shows them: `← → ↑ ↓`, `0–9`, `Shift+A–Z`. */
export function shownKeys(chords: readonly string[]): string {
  const shown: string[] = [];
  for (let k = 0; k < chords.length; ) {
    const run = runFrom(chords, k);
    const [first = '', last = ''] = [chords[k], chords[k + run - 1]];
    if (run >= LEAST_RUN) shown.push(`${shownKey(first)}–${shownKey(last).replace('Shift+', '')}`);
    else shown.push(...chords.slice(k, k + run).map(shownKey));
    k += run;
  }
  return shown.join('  ');
}

/** How many of the chords from place `k` on are characters that follow each other. */
function runFrom(chords: readonly string[], k: number): number {
  let end = k + 1;
  while (end < chords.length && isNext(chords[end - 1] ?? '', chords[end] ?? '')) end++;
  return end - k;
}

function isNext(former: string, next: string): boolean {
  return /^[0-9A-Za-z]{2}$/.test(former + next) && next.charCodeAt(0) === former.charCodeAt(0) + 1;
}

/** `m` is shown as M, what is written by a capital as Shift+M. */
function shownKey(chord: string): string {
  const [, modifiers = '', key = ''] = /^((?:(?:Ctrl|Alt|Shift)\+)*)(.+)$/.exec(chord) ?? [];
  const isCapital = modifiers === '' && /^[A-Z]$/.test(key);
  const sign = SIGNS[key] ?? (key.length === 1 ? key.toUpperCase() : key);
  return `${modifiers}${isCapital ? 'Shift+' : ''}${sign}`;
}
