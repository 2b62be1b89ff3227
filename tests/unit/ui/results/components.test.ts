import { createElement, type ReactElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';
import { problem } from '../../../../src/problem/index.ts';
import {
  ChannelPicker,
  PanelEmpty,
  PanelPending,
  PoleTable,
  ProblemList,
  SystemMatrix,
  TabPanel,
  TabStrip,
} from '../../../../src/ui/results/index.ts';
import { tabAfter } from '../../../../src/ui/results/tab-keys.ts';
import { chain, winch } from './system-matrix-fixture.ts';

const html = (node: ReactElement) => renderToStaticMarkup(node);
const count = (text: string, what: RegExp) => text.match(what)?.length ?? 0;

describe('the system matrix', () => {
  test('has a caption, a head for each column and each row, and all entries', () => {
    const table = html(createElement(SystemMatrix, { model: winch, notation: 'fractions' }));
    expect(table).toContain('4 states, 2 inputs, 1 output.</caption>');
    expect(count(table, /<th scope="col"/g)).toBe(6);
    expect(count(table, /<th scope="row"/g)).toBe(5);
    expect(count(table, /<td id=/g)).toBe(30);
    expect(count(table, /derivative of /g)).toBe(4);
  });

  test('marks rounded entries and says what the mark means, only where there are any', () => {
    const decimals = html(createElement(SystemMatrix, { model: winch, notation: 'decimals' }));
    expect(count(decimals, />≈<\/span>0.333333/g)).toBe(1);
    expect(decimals).toContain('≈ rounded to 6 digits.');
    expect(html(createElement(SystemMatrix, { model: winch, notation: 'fractions' }))).not.toContain('≈');
  });

  test('of poles says which are hidden and why', () => {
    const poles = [
      { re: -1, im: 0, multiplicity: 2 },
      { re: -2, im: 3, multiplicity: 1 },
      { re: -2, im: -3, multiplicity: 1 },
    ];
    const why = { isUncontrollable: true, isUnobservable: false };
    const hidden = [
      { re: -1, im: 0, multiplicity: 1, ...why },
      { re: -2, im: 3, multiplicity: 1, isUncontrollable: true, isUnobservable: true },
    ];
    const table = html(createElement(PoleTable, { poles, zeros: [], route: 'certified', hidden }));
    expect(table).toContain('title="In no transfer function: no input reaches it.">hidden 1 of 2<');
    expect(table).toContain('title="In no transfer function: no input reaches it and no output shows it.">hidden<');
    expect(html(createElement(PoleTable, { poles, zeros: [], route: 'certified' }))).not.toContain('hidden');
  });

  test('becomes a grid that names its entry when it can be pointed at', () => {
    const onPoint = () => undefined;
    const pointed = { row: 0, column: 3 };
    const table = html(createElement(SystemMatrix, { model: winch, notation: 'fractions', onPoint, pointed }));
    const active = /role="grid" tabindex="0" aria-activedescendant="([^"]+)"/.exec(table)?.[1];
    expect(table).toContain(`id="${active}" data-row="0" data-column="3"`);
    expect(count(table, /system-matrix-pointed/g)).toBe(1);
  });

  test('lights up the entries it is told to', () => {
    const lit = [
      { row: 1, column: 0 },
      { row: 3, column: 4 },
    ];
    expect(
      count(html(createElement(SystemMatrix, { model: winch, notation: 'fractions', lit })), /system-matrix-lit/g),
    ).toBe(2);
  });

  test('of a large model holds what is in view and says how large it is', () => {
    const table = html(createElement(SystemMatrix, { model: chain(150), notation: 'fractions' }));
    expect(count(table, /<td id=/g)).toBeLessThan(500);
    expect(table).toContain('aria-rowcount="152" aria-colcount="152"');
    const small = html(createElement(SystemMatrix, { model: chain(24), notation: 'fractions' }));
    expect(count(small, /<td id=/g)).toBe(25 * 25);
  });

  test('says why there is no exact entry', () => {
    const table = html(createElement(SystemMatrix, { model: { ...winch, rational: null }, notation: 'fractions' }));
    expect(table).toContain('Derived in floating point: decimals only.');
  });

  test('of an empty sheet is a sentence', () => {
    const empty = { ...winch, states: [], inputs: [], outputs: [] };
    expect(html(createElement(SystemMatrix, { model: empty, notation: 'fractions' }))).not.toContain('<table');
  });
});

describe('the table of poles', () => {
  const pole = (re: number, im = 0, multiplicity = 1) => ({ re, im, multiplicity });

  test('says how the figures are known', () => {
    const known = (route: 'certified' | 'floating', standsIn = false) =>
      html(createElement(PoleTable, { poles: [pole(-1)], zeros: [], route, standsIn }));
    expect(known('certified')).toContain('every digit proved</caption>');
    expect(known('floating')).toContain('by QR, not certified</caption>');
    expect(known('certified', true)).toContain('every digit proved, with doubles in place of irrational values');
  });

  test('has a pair in one row and the zeros below', () => {
    const table = html(
      createElement(PoleTable, { poles: [pole(-1, 2), pole(-1, -2), pole(-5)], zeros: [pole(-3)], route: 'certified' }),
    );
    expect(count(table, /<th scope="row"/g)).toBe(3);
    expect(table).toContain('−1 ± 2j');
    expect(table).toMatch(/zero −3/);
  });

  test('has a column of multiplicities only where there is one to show', () => {
    const simple = html(createElement(PoleTable, { poles: [pole(-1)], zeros: [], route: 'certified' }));
    const double = html(createElement(PoleTable, { poles: [pole(-1, 0, 2)], zeros: [], route: 'certified' }));
    expect(simple).not.toContain('multiplicity');
    expect(double).toContain('<td>2</td>');
  });

  test('tells zeros that were not computed from none', () => {
    const table = (zeros: [] | null) => html(createElement(PoleTable, { poles: [], zeros, route: 'certified' }));
    expect(table([])).toContain('no zeros');
    expect(table(null)).toContain('zeros not computed');
  });
});

describe('tabs', () => {
  const tabs = [
    { id: 'time', label: 'Time' },
    { id: 'transfer', label: 'Transfer' },
  ] as const;

  test('name their panel, and only the selected one is in the tab order', () => {
    const strip = html(
      createElement(TabStrip, {
        name: 'answers',
        label: 'Answers',
        tabs,
        selected: 'transfer',
        onSelect: () => undefined,
      }),
    );
    expect(strip).toContain('role="tablist" aria-label="Answers"');
    expect(strip).toMatch(/id="answers-tab-time"[^>]*aria-selected="false"[^>]*tabindex="-1"/);
    expect(strip).toMatch(
      /id="answers-tab-transfer"[^>]*aria-selected="true" aria-controls="answers-panel-transfer" tabindex="0"/,
    );
    expect(html(createElement(TabPanel, { name: 'answers', id: 'transfer' }, 'x'))).toContain(
      'id="answers-panel-transfer" aria-labelledby="answers-tab-transfer"',
    );
  });

  test.each([
    ['ArrowRight', 2, 0],
    ['ArrowLeft', 0, 2],
    ['Home', 2, 0],
    ['End', 0, 2],
    ['Enter', 1, null],
  ])('%s from tab %d of three leads to %s', (key, from, to) => {
    expect(tabAfter(key, from, 3)).toBe(to);
  });
});

describe('problems', () => {
  test('have a way to their blocks or their parameter', () => {
    const problems = [
      problem('loop-without-solution', 'The loop through a and b has no unique solution.', { blocks: ['a', 'b'] }),
      problem('unknown-parameter', 'Parameter k: m is not defined.', { parameter: 'k' }),
      problem('not-a-diagram', 'The file is no diagram.'),
    ];
    const list = html(createElement(ProblemList, { problems, onPick: () => undefined }));
    expect(list).toContain('aria-label="Show 2 blocks: a, b">Show 2 blocks</button>');
    expect(list).toContain('aria-label="Show parameter: k">Show parameter</button>');
    expect(count(list, /<li/g)).toBe(3);
    expect(count(list, /<button/g)).toBe(2);
  });

  test('have no button where nothing answers it', () => {
    const problems = [problem('bad-value', 'Gain a: no value.', { blocks: ['a'] })];
    expect(html(createElement(ProblemList, { problems }))).not.toContain('<button');
  });
});

describe('the choice of a channel', () => {
  const signals = (...names: string[]) => names.map(name => ({ name, block: name }));

  test('is a list only where there is a choice', () => {
    const picker = html(
      createElement(ChannelPicker, {
        inputs: signals('r', 'v'),
        outputs: signals('F'),
        channel: { input: 1, output: 0 },
        onPick: () => undefined,
      }),
    );
    expect(count(picker, /<select/g)).toBe(1);
    expect(picker).toMatch(/<select[^>]*aria-label="Input"/);
    expect(picker).toMatch(/<option value="1" selected="">v<\/option>/);
  });

  test('says what is missing', () => {
    const picker = html(
      createElement(ChannelPicker, {
        inputs: [],
        outputs: signals('F'),
        channel: { input: 0, output: 0 },
        onPick: () => undefined,
      }),
    );
    expect(picker).toContain('no input');
  });
});

describe('panels without an answer', () => {
  test('a pending one is announced', () => {
    expect(html(createElement(PanelPending, { label: 'Poles' }))).toContain('role="status"');
  });

  test('an empty one says why', () => {
    expect(html(createElement(PanelEmpty, null, 'Needs an input.'))).toContain('Needs an input.');
  });
});
