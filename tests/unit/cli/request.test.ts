/** Every refusal of an argument, word for word, and what the others are read as. */

import { describe, expect, test } from 'vitest';
import { readRequest } from '../../../src/cli/request.ts';

/** `bad-option` messages; none where the arguments are read. */
function refusals(...argv: string[]): string[] {
  const request = readRequest(argv);
  return request.ok ? [] : request.problems.map(({ code, message }) => `${code}: ${message}`);
}

function requestOf(...argv: string[]) {
  const request = readRequest(argv);
  if (!request.ok) throw new Error(refusals(...argv).join());
  return request.value;
}

describe('arguments', () => {
  test('name a command and a drawing', () => {
    expect(requestOf('check', 'loop.poleward.json')).toEqual({
      command: 'check',
      source: 'loop.poleward.json',
      tolerances: false,
      samples: 200,
      seed: 1,
    });
    expect(requestOf('link', '-')).toEqual({ command: 'link', source: '-' });
    expect(requestOf('derive', '#d1=abc')).toMatchObject({
      command: 'derive',
      source: '#d1=abc',
      format: { id: 'model' },
      notation: 'fractions',
      out: null,
      settings: [],
    });
  });

  test('may have their options in any place and with an equals sign', () => {
    const expected = requestOf('derive', 'a', '--as', 'csv', '--out', 'b', '--set', 'k=1', '--set', 'm = 2*k');
    expect(requestOf('--as=csv', 'derive', '--set=k=1', 'a', '--set=m = 2*k', '--out=b')).toEqual(expected);
    expect(expected).toMatchObject({
      format: { id: 'csv' },
      out: 'b',
      settings: [
        { name: 'k', value: '1' },
        { name: 'm', value: '2*k' },
      ],
    });
  });

  test('say of check how tolerances are sampled', () => {
    expect(requestOf('check', 'a', '--tolerances', '--samples', '0', '--seed=7')).toMatchObject({
      tolerances: true,
      samples: 0,
      seed: 7,
    });
  });

  test('after -- are no options', () => {
    expect(requestOf('check', '--', '--odd.json')).toMatchObject({ command: 'check', source: '--odd.json' });
  });

  test('ask for help and version whatever else they hold', () => {
    expect(requestOf('derive', '--help')).toEqual({ command: 'help' });
    expect(requestOf('--version')).toEqual({ command: 'version' });
  });
});

describe('arguments are refused', () => {
  const formats = 'model, csv, matrix-market, npz, python, c, latex, mathml, text, workings, workings-latex, report';
  test.each([
    [[], 'No command is given. Write derive, check or link; --help tells more.'],
    [['dervie', 'a'], 'There is no command "dervie". Did you mean derive?'],
    [['solve', 'a'], 'There is no command "solve". Write derive, check or link.'],
    [['derive'], 'derive needs a drawing. Write a file, a share link or - after it.'],
    [['check', 'a', 'b'], 'check takes one drawing, and "b" is one too many. Leave it out.'],
    [['derive', 'a', '--otu', 'b'], 'There is no option --otu. Did you mean --out?'],
    [['derive', 'a', '-x'], 'There is no option -x. --help lists them.'],
    [['derive', 'a', '--out'], '--out needs a value after it. Write the path of the file to write.'],
    [['derive', 'a', '--as'], `--as needs a value after it. Write one of ${formats} or diagram.`],
    [['derive', 'a', '--set'], '--set needs a value after it. Write NAME=EXPR, for instance Kp=2/3.'],
    [['derive', 'a', '--notation'], '--notation needs a value after it. Write symbols, fractions or decimals.'],
    [['derive', 'a', '--as', 'cvs'], 'There is no format "cvs". Did you mean csv?'],
    [['derive', 'a', '--as', 'word'], `There is no format "word". Write ${formats} or diagram.`],
    [['derive', 'a', '--notation', 'decimal'], 'There is no notation "decimal". Did you mean decimals?'],
    [['derive', 'a', '--set', 'k'], '--set "k" sets nothing. Write NAME=EXPR, for instance Kp=2/3.'],
    [['derive', 'a', '--set', '=1'], '--set "=1" sets nothing. Write NAME=EXPR, for instance Kp=2/3.'],
    [['derive', 'a', '--help=yes'], '--help takes no value. Leave out "=yes".'],
    [['check', 'a', '--as', 'csv'], 'check takes no --as. Only derive does.'],
    [['link', 'a', '--tolerances'], 'link takes no --tolerances. Only check does.'],
    [['derive', 'a', '--seed', '1'], 'derive takes no --seed. Only check does.'],
    [['check', 'a', '--samples'], '--samples needs a value after it. Write how many points to draw at random.'],
    [['check', 'a', '--samples', '1e3'], '--samples "1e3" is no whole number from 0 to 100000.'],
    [['check', 'a', '--seed', '0'], '--seed "0" is no whole number from 1 to 2147483646.'],
    [['link', '#d1=abc'], 'link makes a link of a file or of -, and this is one already.'],
  ])('%j', (argv, message) => {
    expect(refusals(...argv)).toEqual([`bad-option: ${message}`]);
  });
});
