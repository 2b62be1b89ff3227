/** The order of the rooms holds: over the sources as they are, in the lint rules, and for wrong imports made up here. */

import { describe, expect, test } from 'vitest';
import { complaintsAbout, importsIn } from './imports.ts';
import { MAY_IMPORT } from './rooms.ts';
import { projectFile, sourceFiles } from './source-files.ts';

const files = sourceFiles();

describe('the sources', () => {
  test('keep the order of the rooms and use each through its index', () => {
    expect(complaintsAbout(files)).toEqual([]);
  });

  test('lie in rooms that the table knows', () => {
    const rooms = new Set(files.map(({ path }) => path.split('/')[1]));
    expect([...rooms].filter(room => MAY_IMPORT[room ?? ''] === undefined)).toEqual([]);
    expect(rooms.size).toBeGreaterThan(3);
  });

  test('are read well enough to find their imports', () => {
    const found = files.flatMap(({ text }) => importsIn(text));
    expect(found).toContain('../problem/index.ts');
    expect(found.length).toBeGreaterThan(files.length / 2);
  });
});

describe('a wrong import is found', () => {
  const complain = (path: string, text: string) =>
    complaintsAbout([
      { path, text },
      { path: 'src/ui/store/index.ts', text: '' },
    ]);

  test('of a room further left', () => {
    expect(complain('src/compile/a.ts', "import { x } from '../analysis/index.ts';")).toEqual([
      'src/compile/a.ts imports ../analysis/index.ts: compile may not import analysis',
    ]);
  });

  test('of a room beside it', () => {
    expect(complain('src/share/a.ts', "import type { X } from '../deliver/index.ts';")).toEqual([
      'src/share/a.ts imports ../deliver/index.ts: share may not import deliver',
    ]);
  });

  test('from anywhere of the command line', () => {
    expect(complain('src/ui/a.ts', "import { main } from '../cli/main.ts';")).toHaveLength(1);
  });

  test('past the index of another room', () => {
    expect(complain('src/deliver/a.ts', "import { x } from '../diagram/geometry/box.ts';")).toEqual([
      'src/deliver/a.ts imports ../diagram/geometry/box.ts: other folders import src/diagram only through its index',
    ]);
  });

  test('past the index of a folder of the same room', () => {
    expect(complain('src/ui/shell/a.ts', "import { x } from '../store/view.ts';")).toEqual([
      'src/ui/shell/a.ts imports ../store/view.ts: other folders import src/ui/store only through its index',
    ]);
  });

  test('of a library that belongs to another room', () => {
    expect(complain('src/analysis/a.ts', "import { useMemo } from 'react';")).toEqual([
      'src/analysis/a.ts imports react: only ui may',
    ]);
    expect(complain('src/share/a.ts', "import { readFileSync } from 'node:fs';")).toHaveLength(1);
    expect(complain('src/ui/a.ts', "import something from 'something';")).toHaveLength(1);
  });

  test.each([
    ['exported again', "export { x } from '../ui/index.ts';"],
    ['for its effects', "import '../ui/index.ts';"],
    ['on demand', "const x = await import('../ui/index.ts');"],
    ['over several lines', "import {\n  x,\n  y,\n} from '../ui/index.ts';"],
    ['as the file of a worker', "new Worker(new URL('../ui/worker.ts', import.meta.url))"],
  ])('%s', (_, text) => {
    expect(complain('src/algebra/a.ts', text)).toHaveLength(1);
  });

  test('but not in a comment, nor where it is right', () => {
    expect(complain('src/algebra/a.ts', "/** import { x } from '../ui/index.ts' */\n// import '../ui/a.ts';")).toEqual(
      [],
    );
    expect(
      complain('src/compile/a.ts', "import { x } from '../diagram/index.ts';\nimport { y } from './y.ts';"),
    ).toEqual([]);
  });
});

describe('the lint rules', () => {
  interface Override {
    readonly includes: readonly string[];
    readonly linter: {
      readonly rules: {
        readonly style: {
          readonly noRestrictedImports: { readonly options: { readonly patterns: readonly { group: string[] }[] } };
        };
      };
    };
  }
  const { overrides } = JSON.parse(projectFile('.biome.json')) as { overrides: readonly Override[] };
  const rooms = Object.keys(MAY_IMPORT);

  test.each(rooms)('forbid %s the rooms that the table does not allow it, and no others', room => {
    const override = overrides.find(({ includes }) => includes.includes(`src/${room}/**`));
    const groups =
      override?.linter.rules.style.noRestrictedImports.options.patterns.flatMap(({ group }) => group) ?? [];
    const forbidden = rooms.filter(other => groups.includes(`**/${other}/**`));
    expect(forbidden).toEqual(rooms.filter(other => other !== room && !MAY_IMPORT[room]?.includes(other)));
  });
});
