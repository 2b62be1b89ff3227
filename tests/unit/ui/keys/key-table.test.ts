import { describe, expect, test } from 'vitest';
import { chordOf, isDoneBy, type KeyPress, type KeyRow, shownKeys } from '../../../../src/ui/keys/index.ts';

const press = (key: string, also: Partial<KeyPress> = {}): KeyPress => ({
  key,
  code: '',
  shiftKey: false,
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  ...also,
});

describe('the chord of a pressed key', () => {
  test('is the character that it writes, whatever Shift did for it', () => {
    expect(chordOf(press('m'))).toBe('m');
    expect(chordOf(press('K', { shiftKey: true }))).toBe('K');
    expect(chordOf(press('?', { shiftKey: true }))).toBe('?');
  });

  test('counts Shift for keys that write nothing, and Ctrl and Cmd alike', () => {
    expect(chordOf(press('ArrowLeft', { shiftKey: true }))).toBe('Shift+ArrowLeft');
    expect(chordOf(press('Z', { ctrlKey: true, shiftKey: true }))).toBe('Ctrl+Shift+z');
    expect(chordOf(press('z', { metaKey: true }))).toBe('Ctrl+z');
  });

  test('goes by the place of the key with Alt, which changes what some letters write', () => {
    expect(chordOf(press('ç', { altKey: true, code: 'KeyC' }))).toBe('Alt+c');
    expect(chordOf(press('Ç', { altKey: true, shiftKey: true, code: 'KeyC' }))).toBe('Alt+Shift+c');
    expect(chordOf(press('ArrowUp', { altKey: true, code: 'ArrowUp' }))).toBe('Alt+ArrowUp');
  });

  test('is the character itself where it needs the third level of the keyboard', () => {
    const third = {
      ctrlKey: true,
      altKey: true,
      code: 'KeyQ',
      getModifierState: (name: string) => name === 'AltGraph',
    };
    expect(chordOf(press('@', third))).toBe('@');
  });
});

test('rows of one chord are asked in their order until one did something', () => {
  const asked: string[] = [];
  const row = (name: string, isDone: boolean): KeyRow => ({
    group: 'On the sheet',
    keys: ['m'],
    does: name,
    act: () => {
      asked.push(name);
      return isDone;
    },
  });
  const rows = [row('first', false), row('second', true), row('third', true)];
  expect(isDoneBy(rows, press('m'), () => undefined)).toBe(true);
  expect(asked).toEqual(['first', 'second']);
  expect(isDoneBy(rows, press('n'), () => undefined)).toBe(false);
});

test('chords are shown by their signs, runs of characters by their ends', () => {
  expect(shownKeys(['ArrowLeft', 'Shift+ArrowRight', ' '])).toBe('←  Shift+→  Space');
  expect(shownKeys([...'0123456789', ...'ABCD', '+'])).toBe('0–9  Shift+A–D  +');
  expect(shownKeys(['m', 'Ctrl+d', 'Alt+Shift+c', 'K'])).toBe('M  Ctrl+D  Alt+Shift+C  Shift+K');
});
