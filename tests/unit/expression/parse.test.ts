import { describe, expect, test } from 'vitest';
import { type Expression, parseExpression, print } from '../../../src/expression/index.ts';
import { problemsOf, valueOf } from '../results.ts';

const tree = (text: string): Expression => valueOf(parseExpression(text));

/** Every operation in its own parentheses, so that the order of operations shows. */
function grouped(node: Expression): string {
  switch (node.kind) {
    case 'number':
      return node.text;
    case 'name':
      return node.name;
    case 'unary':
      return `(-${grouped(node.operand)})`;
    case 'binary':
      return `(${grouped(node.left)}${node.operator}${grouped(node.right)})`;
    case 'call':
      return `${node.function}(${node.arguments.map(grouped).join(',')})`;
    default:
      return node satisfies never;
  }
}

describe('the order of operations', () => {
  test.each([
    ['a + b*c', '(a+(b*c))'],
    ['a - b - c', '((a-b)-c)'],
    ['a/b*c', '((a/b)*c)'],
    ['a/b/c', '((a/b)/c)'],
    ['a^b^c', '(a^(b^c))'],
    ['-a^2', '(-(a^2))'],
    ['(-a)^2', '((-a)^2)'],
    ['2^-n', '(2^(-n))'],
    ['2^-n^m', '(2^(-(n^m)))'],
    ['-a*b', '((-a)*b)'],
    ['a*-b', '(a*(-b))'],
    ['a - -b', '(a-(-b))'],
    ['--a', '(-(-a))'],
    ['((a))', 'a'],
    ['sqrt(a + b)*atan2(c, -d)', '(sqrt((a+b))*atan2(c,(-d)))'],
    ['min(a, b, max(c))', 'min(a,b,max(c))'],
    ['sin (x)', 'sin(x)'],
    ['\ta\n+ b ', '(a+b)'],
  ])('%s is %s', (text, expected) => {
    expect(grouped(tree(text))).toBe(expected);
  });

  test('names that a parser could take for words of its own are names', () => {
    const names = [
      'mod',
      'to',
      'in',
      'and',
      'or',
      'not',
      'xor',
      'true',
      'false',
      'null',
      'undefined',
      'NaN',
      'end',
      'i',
    ];
    for (const name of [...names, 'Infinity', 'constructor', 'toString', 'x0', 'x1']) {
      expect(tree(`2*${name} + 1`)).toMatchObject({ left: { right: { kind: 'name', name } } });
    }
  });
});

describe('a literal', () => {
  test.each([
    ['0.1', 1n, 10n],
    ['1e-3', 1n, 1000n],
    ['1E5', 100000n, 1n],
    ['.5', 1n, 2n],
    ['5.', 5n, 1n],
    ['12.50', 25n, 2n],
    ['4.2e+3', 4200n, 1n],
    ['0.1000000000000000055511151231257827', 1000000000000000055511151231257827n, 10000000000000000000000000000000000n],
  ])('%s is read exactly', (text, n, d) => {
    expect(tree(text)).toEqual({ kind: 'number', text, value: { n, d } });
  });

  test('is refused beyond what is kept exactly', () => {
    expect(problemsOf(parseExpression('1e401'))).toEqual([
      'bad-expression: 1e401 is beyond what is kept exactly: exponents go from -400 to 400.',
    ]);
    expect(parseExpression('1e400').ok).toBe(true);
    expect(parseExpression('1e-400').ok).toBe(true);
  });
});

describe('text that is no expression is refused and told what to write', () => {
  test.each([
    ['2 k', 'Write 2*k.'],
    ['2k', 'Write 2*k.'],
    ['2(3)', 'Write 2*(3).'],
    ['(a+b)(c - 1)', 'Write (a+b)*(c - 1).'],
    ['a b c', 'Write a*b*c.'],
    ['3 + 2 k', 'Write 3 + 2*k.'],
    ['k(3)', 'Write k*(3).'],
    ['2 sin(x)', 'Write 2*sin(x).'],
    ['0x10', 'Write 0*x10.'],
    ['2e', 'Write 2*e.'],
    ['2 k + )', 'Write 2*k.'],
    ['f(2, 3)', 'There is no function f; for a product write f*(.'],
    ['1.2.3', '1.2.3 is not a number.'],
    ['1 2', 'Write an operator between 1 and 2.'],
    ['1,5', 'Write a decimal point: 1.5.'],
    ['a, b', 'A comma stands only between the arguments of a function.'],
    ['sqr(2)', 'There is no function sqr. Did you mean sqrt?'],
    ['SIN(x)', 'There is no function SIN. Did you mean sin?'],
    ['log(x)', 'Write ln for the natural logarithm, log10 for the one to base 10.'],
    ['sqrt', 'Write what sqrt is of in parentheses: sqrt(x).'],
    ['sqrt + 1', 'Write what sqrt is of in parentheses: sqrt(x).'],
    ['sqrt(1, 2)', 'sqrt takes one argument.'],
    ['atan2(1)', 'atan2 takes two arguments, separated by a comma.'],
    ['atan2(1, 2, 3)', 'atan2 takes two arguments, separated by a comma.'],
    ['min()', 'Something is missing between ( and ).'],
    ['max(1, )', 'Something is missing between , and ).'],
    ['+k', 'Leave out the + in front.'],
    ['2*+k', 'Leave out the + after *.'],
    ['2*', 'Something is missing after *.'],
    ['*2', 'Something is missing before *.'],
    ['2**3', 'Write ^ for a power.'],
    ['2*/3', 'Something is missing between * and /.'],
    ['()', 'Something is missing between ( and ).'],
    ['(1', 'A ) is missing at the end.'],
    ['((1', 'At the end 2 ) are missing.'],
    ['1)', 'A ) closes what no ( has opened.'],
    ['2−1', 'Write - for −.'],
    ['2×3', 'Write * for ×.'],
    ['6÷3', 'Write / for ÷.'],
    ['x²', 'Write ^2 for ².'],
    ['2*ω', 'Write omega for ω.'],
    ['Δ', 'Write Delta for Δ.'],
    ['_a', 'A name begins with a letter.'],
    ['a = 1', '= has no meaning in it. Take it out.'],
    ['[1, 2]', '[ has no meaning in it. Take it out.'],
    ['5 %', '% has no meaning in it. Take it out.'],
    ['"text"', '" has no meaning in it. Take it out.'],
    ["a'", "' has no meaning in it. Take it out."],
    ['3!', '! has no meaning in it. Take it out.'],
    ['a;b', '; has no meaning in it. Take it out.'],
    ['a.b', '. has no meaning in it. Take it out.'],
    ['a ? b : c', '? has no meaning in it. Take it out.'],
    ['a\u00a0+ b', 'The character U+00A0 has no meaning in it. Take it out.'],
  ])('%s: %s', (text, advice) => {
    expect(problemsOf(parseExpression(text))).toEqual([`bad-expression: "${text}" is not an expression. ${advice}`]);
  });

  test('nothing at all', () => {
    for (const text of ['', '  \n']) {
      expect(problemsOf(parseExpression(text))).toEqual([
        'bad-expression: Nothing is written here. Write a number or a formula.',
      ]);
    }
  });

  test('a long text is quoted in part and the place named', () => {
    const text = `${'a + '.repeat(20)}2 k`;
    const quoted = 'a + '.repeat(20).slice(0, 59);
    expect(problemsOf(parseExpression(text))).toEqual([
      `bad-expression: "${quoted}…" is not an expression. Write 2*k.`,
    ]);
  });

  test('long names are repeated in part', () => {
    const name = 'n'.repeat(500);
    expect(problemsOf(parseExpression(`2 ${name}`))).toEqual([
      `bad-expression: "2 ${'n'.repeat(57)}…" is not an expression. Write 2*${'n'.repeat(23)}….`,
    ]);
  });

  test('line breaks between two factors do not reach the message', () => {
    expect(problemsOf(parseExpression('a\nmin'))).toEqual([
      'bad-expression: "a min" is not an expression. Write a*min.',
    ]);
    expect(problemsOf(parseExpression('a\n b'))).toEqual(['bad-expression: "a  b" is not an expression. Write a*b.']);
  });

  test('control characters do not reach the message', () => {
    expect(problemsOf(parseExpression('a\u0007 b\u2028'))).toEqual([
      'bad-expression: "a  b " is not an expression. The character U+0007 has no meaning in it. Take it out.',
    ]);
  });
});

describe('the limits', () => {
  test('10,000 characters are read, one more is not', () => {
    expect(parseExpression('1'.repeat(10_000)).ok).toBe(true);
    expect(problemsOf(parseExpression('1'.repeat(10_001)))).toEqual([
      `bad-expression: "${'1'.repeat(59)}…" is not an expression. ` +
        'It is 10001 characters long, the limit is 10000. Define parts of it as parameters.',
    ]);
  });

  const nestings: readonly (readonly [string, (depth: number) => string])[] = [
    ['parentheses', depth => `${'('.repeat(depth)}1${')'.repeat(depth)}`],
    ['calls', depth => `${'abs('.repeat(depth)}1${')'.repeat(depth)}`],
    ['minus signs', depth => `${'-'.repeat(depth)}1`],
    ['powers', depth => `${'1^'.repeat(depth)}1`],
    ['all of them', depth => `${'-(2^'.repeat(Math.floor(depth / 3))}1${')'.repeat(Math.floor(depth / 3))}`],
  ];
  test.each(nestings)('%s nested 250 deep are read, 251 deep are not', (_, nested) => {
    expect(parseExpression(nested(250)).ok).toBe(true);
    expect(problemsOf(parseExpression(nested(253)))[0]).toMatch(
      /^bad-expression: ".{59}…" is not an expression\. It is nested more than 250 deep\. Define parts of it as parameters\.$/,
    );
  });

  test('exactly 251 parentheses are too many', () => {
    expect(parseExpression(`${'('.repeat(251)}1${')'.repeat(251)}`).ok).toBe(false);
  });

  test('what has closed again does not count as nesting', () => {
    expect(parseExpression(Array(1000).fill('(-2^-3)').join('*')).ok).toBe(true);
    expect(parseExpression(Array(2000).fill('-1').join('-')).ok).toBe(true);
    expect(parseExpression(`${Array(2000).fill('a^-b').join('*')}`).ok).toBe(true);
  });

  test('a sum of 5,000 terms is read and printed', () => {
    const text = Array(5000).fill('a').join('+');
    expect(print(tree(text)).replaceAll(' ', '')).toBe(text);
  });

  test('10,000 opening parentheses are refused and not run into', () => {
    expect(parseExpression('('.repeat(10_000)).ok).toBe(false);
    expect(parseExpression('-'.repeat(10_000)).ok).toBe(false);
    expect(parseExpression('a^'.repeat(5000)).ok).toBe(false);
    expect(parseExpression('sin('.repeat(2500)).ok).toBe(false);
  });
});

describe('printing', () => {
  test.each([
    ['((a))+(b)', 'a + b'],
    ['a-(b-c)', 'a - (b - c)'],
    ['(a-b)-c', 'a - b - c'],
    ['a/(b*c)', 'a/(b*c)'],
    ['(a/b)*c', 'a/b*c'],
    ['(a^b)^c', '(a^b)^c'],
    ['a^(b^c)', 'a^b^c'],
    ['(-a)^2', '(-a)^2'],
    ['-(a*b)', '-(a*b)'],
    ['a*(-b)', 'a*-b'],
    ['2^(-n)', '2^-n'],
    ['min( a,b )', 'min(a, b)'],
  ])('%s is printed as %s', (text, expected) => {
    expect(print(tree(text))).toBe(expected);
  });
});
