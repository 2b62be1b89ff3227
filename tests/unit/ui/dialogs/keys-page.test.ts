import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';
import { keyPages } from '../../../../src/ui/dialogs/keys-page.ts';
import { shownKeys } from '../../../../src/ui/keys/index.ts';
import { SHEET_KEYS } from '../../../../src/ui/sheet/all-sheet-keys.ts';
import { PAGE_KEYS } from '../../../../src/ui/shell/page-keys.ts';

const UI = fileURLToPath(new URL('../../../../src/ui/', import.meta.url));

/** Handlers that look every key up in a table. */
const BY_TABLE = ['shell/usePageKeys.ts', 'sheet/useSheetKeys.ts'];

/** What takes keys only while the focus is in it, and the group of the page that says so. */
const LOCAL: Readonly<Record<string, string>> = {
  'annotations/WritingField.tsx': 'In a field',
  'dialogs/DrawingsKept.tsx': 'In a field',
  'requirements/RequirementForm.tsx': 'In a field',
  'shell/Heading.tsx': 'In a field',
  'sheet/BlockFields.tsx': 'In a field',
  'sheet/FindField.tsx': 'In a field',
  'title-block/RangeFields.tsx': 'In a field',
  'title-block/TextField.tsx': 'In a field',
  'title-block/TitleFields.tsx': 'In a field',
  'title-block/ParameterSlider.tsx': 'On a slider',
  'write-line/WriteField.tsx': 'In the write-a-block line',
  'frequency/BodePlot.tsx': 'In tabs, in the matrix and on plots',
  'plots/HorizonGrip.tsx': 'In tabs, in the matrix and on plots',
  'plots/PoleMap.tsx': 'In tabs, in the matrix and on plots',
  'plots/StepPlot.tsx': 'In tabs, in the matrix and on plots',
  'plots/pole-map-pointer.ts': 'In tabs, in the matrix and on plots',
  'results/SystemMatrix.tsx': 'In tabs, in the matrix and on plots',
  'results/TabStrip.tsx': 'In tabs, in the matrix and on plots',
  'results/matrix-keys.ts': 'In tabs, in the matrix and on plots',
  'results/tab-keys.ts': 'In tabs, in the matrix and on plots',
  'sheet/usePointedPart.ts': 'In tabs, in the matrix and on plots',
  'trace/TraceLine.tsx': 'In tabs, in the matrix and on plots',
};

/** Names of keys, as a handler writes them and as the page does. */
const NAMED = /\b(Arrow(?:Left|Right|Up|Down)|Home|End|PageUp|PageDown|Enter|Escape|Tab|Delete|Backspace)\b/g;

function filesThatTakeKeys(): readonly string[] {
  const files = readdirSync(UI, { recursive: true, encoding: 'utf8' }).map(file => file.replaceAll('\\', '/'));
  return files.filter(
    file => /\.tsx?$/.test(file) && /onKeyDown=|addEventListener\('keydown'/.test(readFileSync(join(UI, file), 'utf8')),
  );
}

describe('the page of keys', () => {
  test('has a line for every key that a handler looks up, with what it does', () => {
    const lines = keyPages().flatMap(({ lines }) => lines);
    for (const row of [...SHEET_KEYS, ...PAGE_KEYS]) {
      expect(lines).toContainEqual({ shown: shownKeys(row.keys), does: row.does });
      expect(row.does).not.toBe('');
    }
  });

  test('shows no line twice', () => {
    for (const { group, lines } of keyPages()) {
      const written = lines.map(({ shown, does }) => `${shown} ${does}`);
      expect(new Set(written).size, group).toBe(written.length);
    }
  });

  test('knows of every file that takes keys', () => {
    const unknown = filesThatTakeKeys().filter(file => !BY_TABLE.includes(file) && LOCAL[file] === undefined);
    expect(unknown).toEqual([]);
  });

  test('names every key that a field, a table or a plot takes', () => {
    const pages = new Map(keyPages().map(({ group, lines }) => [group, lines.map(({ shown }) => shown).join('  ')]));
    let found = 0;
    for (const [file, group] of Object.entries(LOCAL)) {
      const source = readFileSync(join(UI, file), 'utf8').replace(/^import .*$/gm, '');
      const quoted = [...source.matchAll(/'([A-Za-z]+)'|^\s+([A-Za-z]+): /gm)].flatMap(([, a, b]) => a ?? b ?? []);
      const keys = quoted.flatMap(word => word.match(NAMED)?.filter(key => key === word) ?? []);
      found += keys.length;
      for (const key of keys)
        expect(`${group}: ${pages.get(group)}`, `${file} takes ${key}`).toContain(shownKeys([key]));
    }
    expect(found).toBeGreaterThan(30);
  });

  test('gives a key two meanings only by what is chosen', () => {
    const meanings = new Map<string, string[]>();
    for (const { keys, group } of SHEET_KEYS) {
      if (group === 'Texts and frames') continue;
      for (const key of keys) meanings.set(key, [...(meanings.get(key) ?? []), group]);
    }
    const shared = [...meanings].filter(([, groups]) => groups.length > 1).map(([key]) => key);
    // A sign is a selected wire's, else it begins a block.
    expect(shared.sort()).toEqual(['+', '-']);
  });
});
