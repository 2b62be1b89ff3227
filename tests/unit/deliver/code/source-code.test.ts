/**
 * The exports of source code compute the matrices: the C text evaluated line by line on every machine, the C file by a compiler and the
 * Python module by Python with NumPy where the machine has them. Expected values are those that the model's numbers were derived to,
 * and at other values of the parameters a derivation at those.
 */

import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { toRows } from '../../../../src/algebra/index.ts';
import { compile, type StateSpace } from '../../../../src/compile/index.ts';
import { type Diagram, readDiagram, startingDrawing, workedDrawings } from '../../../../src/diagram/index.ts';
import { evaluateParameters, namesIn, parseExpression } from '../../../../src/expression/index.ts';
import { draw, gain, input, integrator, output, sum } from '../../../arbitraries/draw.ts';
import motor from '../../../reference/cases/dc-motor-symbolic.json';
import { valueOf } from '../../results.ts';
import { hasPython, python } from '../python.ts';
import { textIn } from '../written.ts';

/** Names that C and Python keep for themselves, an irrational part, derived parameters, text that would end a comment. */
const ODD: Diagram = {
  ...draw(
    [
      input('u'),
      sum('e', '+-'),
      gain('g', 'wn^2*lambda/A'),
      integrator('x'),
      gain('h', 'p*max(int, 2, lambda) + ln(A)^-2 + pi'),
      output('y'),
    ],
    ['u -> e', 'e -> g', 'g -> x', 'x -> h', 'h -> e:1', 'x -> y'],
  ),
  title: 'Odd */ names "x" \\',
  parameters: [
    { name: 'lambda', value: '2', unit: '1/s', note: 'a */ note' },
    { name: 'p', value: '2*wn' },
    { name: 'wn', value: 'sqrt(int/lambda)' },
    { name: 'int', value: '3.5' },
    { name: 'A', value: '1e-3' },
  ],
};

const DRAWINGS: readonly (readonly [string, Diagram])[] = [
  ['odd names', ODD],
  ['the motor of the reference case', valueOf(readDiagram(JSON.stringify(motor.diagram)))],
  ['the starting drawing', startingDrawing()],
  ...workedDrawings().map(({ diagram }) => [diagram.title, diagram] as const),
];

const KEYS = ['A', 'B', 'C', 'D'] as const;
type Rows = Record<(typeof KEYS)[number], readonly (readonly number[])[]>;

function rowsOf({ numeric }: StateSpace): Rows {
  const { A, B, C, D } = numeric;
  return { A: toRows(A, 0), B: toRows(B, 0), C: toRows(C, 0), D: toRows(D, 0) };
}

function expectSame(found: Rows, expected: Rows): void {
  for (const key of KEYS) {
    expected[key].forEach((row, i) => {
      row.forEach((value, j) => {
        expect(Math.abs((found[key][i]?.[j] ?? Number.NaN) - value)).toBeLessThanOrEqual(
          1e-12 * Math.abs(value) + 1e-300,
        );
      });
    });
  }
}

const derive = (diagram: Diagram) => valueOf(compile(diagram));
const write = (format: string, diagram: Diagram) => textIn(format, derive(diagram), 'symbols', diagram);

/** The drawing with every parameter that is not made of others at another value. */
function moved(diagram: Diagram): Diagram {
  const parameters = diagram.parameters.map((each, i) =>
    namesOf(each.value).length > 0 ? each : { ...each, value: `(${each.value})*${17 + i}/16` },
  );
  return { ...diagram, parameters };
}

const namesOf = (text: string) => namesIn(valueOf(parseExpression(text)));

/** The values of all parameters by name. */
const valuesOf = ({ parameters }: Diagram) =>
  Object.fromEntries([...valueOf(evaluateParameters(parameters))].map(([name, { double }]) => [name, double]));

/** What the assignments of the C text come to, its few functions being those of Math. */
function evaluateC(text: string, values: Readonly<Record<string, number>>): Rows {
  const fields = [...text.matchAll(/^ {4}double (\w+);/gm)].map(([, field = '']) => field);
  const p = Object.fromEntries(
    fields.map(field => [field, values[field] ?? values[field.replace(/_+$/, '')] ?? Number.NaN]),
  );
  const body = text
    .slice(text.indexOf('void matrices('))
    .split('\n')
    .filter(line => /^ {4}(const double|[ABCD]\[)/.test(line))
    .join('\n')
    .replaceAll('const double', 'const')
    .replaceAll('p->', 'p.');
  const names = ['pow', 'sqrt', 'log', 'fabs', 'fmin', 'fmax', 'exp', 'sin', 'cos', 'tan'];
  const functions = [
    Math.pow,
    Math.sqrt,
    Math.log,
    Math.abs,
    Math.min,
    Math.max,
    Math.exp,
    Math.sin,
    Math.cos,
    Math.tan,
  ];
  const grid = () => Array.from({ length: 64 }, () => new Array<number>(64).fill(0));
  const found = { A: grid(), B: grid(), C: grid(), D: grid() };
  new Function('p', ...KEYS, ...names, body)(p, ...KEYS.map(key => found[key]), ...functions);
  return found;
}

describe('the C source', () => {
  test.each(DRAWINGS)('computes the matrices of %s, also at other values', (_, diagram) => {
    const text = write('c', diagram);
    expectSame(evaluateC(text, valuesOf(diagram)), rowsOf(derive(diagram).model));
    const other = moved(diagram);
    expectSame(evaluateC(text, valuesOf(other)), rowsOf(derive(other).model));
  });

  const hasCompiler = spawnSync('cc', ['--version'], { stdio: 'ignore' }).status === 0;

  test.runIf(hasCompiler).each(DRAWINGS)(
    'of %s compiles without a warning and fills the same matrices',
    (_, diagram) => {
      const { model } = derive(diagram);
      const folder = mkdtempSync(join(tmpdir(), 'poleward-'));
      try {
        writeFileSync(join(folder, 'model.c'), `${write('c', diagram)}\n${printer(model, diagram)}`);
        const flags = ['-std=c99', '-Wall', '-Wextra', '-pedantic', '-Werror'];
        const { status, stderr } = spawnSync('cc', [...flags, '-o', 'model', 'model.c', '-lm'], {
          cwd: folder,
          encoding: 'utf8',
        });
        expect(stderr).toBe('');
        expect(status).toBe(0);
        const printed = spawnSync(join(folder, 'model'), { encoding: 'utf8' }).stdout;
        const numbers = printed.trim().split(/\s+/).map(Number);
        expect(numbers).toHaveLength(Object.values(rowsOf(model)).flat(2).length);
        let next = 0;
        const read = (key: (typeof KEYS)[number]) => rowsOf(model)[key].map(row => row.map(() => numbers[next++] ?? 0));
        expectSame({ A: read('A'), B: read('B'), C: read('C'), D: read('D') }, rowsOf(model));
      } finally {
        rmSync(folder, { recursive: true });
      }
    },
  );
});

/** A main function that prints every entry at the values as drawn. */
function printer(model: StateSpace, { parameters }: Diagram): string {
  const shapes = rowsOf(model);
  const there = KEYS.filter(key => (shapes[key][0]?.length ?? 0) > 0);
  const declared = there.map(key => `double ${key}[${shapes[key].length}][${shapes[key][0]?.length}];`).join(' ');
  const loops = there.map(
    key =>
      `for (int i = 0; i < ${shapes[key].length}; i++) for (int j = 0; j < ${shapes[key][0]?.length}; j++) printf("%.17g\\n", ${key}[i][j]);`,
  );
  const first = parameters.length > 0 ? '&as_drawn, ' : '';
  return `#include <stdio.h>\nint main(void) { ${declared} matrices(${first}${there.join(', ')}); ${loops.join(' ')} return 0; }\n`;
}

describe('the Python module', () => {
  test.runIf(hasPython).each(DRAWINGS)('of %s returns the matrices, also at other values', (_, diagram) => {
    const folder = mkdtempSync(join(tmpdir(), 'poleward-'));
    try {
      writeFileSync(join(folder, 'model.py'), write('python', diagram));
      const other = moved(diagram);
      const program = [
        'import inspect, json, sys',
        'sys.path.insert(0, sys.argv[1])',
        'import model',
        'values = json.loads(sys.argv[2])',
        'taken = inspect.signature(model.matrices).parameters',
        'given = {n: values[n] if n in values else values[n.rstrip("_")] for n in taken}',
        'out = lambda m: [a.tolist() for a in m]',
        'print(json.dumps([out(model.matrices()), out(model.matrices(**given)), list(model.STATES)]))',
      ].join('\n');
      const [drawn, atOther, states] = python(program, folder, JSON.stringify(valuesOf(other))) as [
        number[][][],
        number[][][],
        string[],
      ];
      const named = ([A = [], B = [], C = [], D = []]: number[][][]) => ({ A, B, C, D });
      const { model } = derive(diagram);
      expectSame(named(drawn), rowsOf(model));
      expectSame(named(atOther), rowsOf(derive(other).model));
      expect(states).toEqual(model.states.map(({ name }) => name));
    } finally {
      rmSync(folder, { recursive: true });
    }
  });

  test('gives names that the language keeps an underscore', () => {
    expect(write('python', ODD)).toContain('    lambda_=2,  # 1/s: a */ note\n');
    expect(write('c', ODD)).toContain('    double int_;\n');
  });

  test('of a drawing without formulas holds the numbers, and says why', () => {
    const lag = draw([input('u'), integrator('x'), output('y')], ['u -> x', 'x -> y']);
    const derivation = { ...derive(lag), route: 'double' as const };
    const text = textIn('python', derivation, 'symbols', lag);
    expect(text).toContain('The drawing is too large for formulas.');
    expect(text).toContain('def matrices():\n');
  });
});
