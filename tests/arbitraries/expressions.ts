/** Generators of expressions: trees as the parser makes them, text made of the language's tokens, and text of any kind. */

import fc from 'fast-check';
import { parseRational, ZERO } from '../../src/algebra/index.ts';
import { type Expression, FUNCTION_NAMES } from '../../src/expression/index.ts';

/** Names that the trees use; none is reserved. */
export const NAMES: readonly string[] = ['a', 'b', 'K_p', 'omega', 'e1', 'mod'];

const digits = fc.stringMatching(/^\d{1,6}$/);

/** Literals in every form that is legal, small enough to be multiplied. */
export const literalText: fc.Arbitrary<string> = fc.oneof(
  fc.constantFrom('0', '1', '2', '0.1', '.5', '5.', '1e-3', '2E+3', '007'),
  fc.nat({ max: 999 }).map(String),
  fc.tuple(digits, digits).map(([whole, decimals]) => `${whole}.${decimals}`),
  fc.tuple(digits, fc.integer({ min: -9, max: 9 })).map(([whole, exponent]) => `${whole}e${exponent}`),
);

const literal = literalText.map((text): Expression => ({ kind: 'number', text, value: parseRational(text) ?? ZERO }));
const name = fc.constantFrom(...NAMES).map((text): Expression => ({ kind: 'name', name: text }));

const binary = (operators: readonly ('+' | '-' | '*' | '/' | '^')[], part: fc.Arbitrary<Expression>) =>
  fc
    .tuple(fc.constantFrom(...operators), part, part)
    .map(([operator, left, right]): Expression => ({ kind: 'binary', operator, left, right }));

const negative = (part: fc.Arbitrary<Expression>) =>
  part.map((operand): Expression => ({ kind: 'unary', operator: '-', operand }));

/** A function with as many arguments as it takes. */
const call = (part: fc.Arbitrary<Expression>) =>
  fc.tuple(fc.constantFrom(...FUNCTION_NAMES), part, part).map(([called, first, second]): Expression => {
    const isOfTwo = called === 'atan2' || called === 'min' || called === 'max';
    return { kind: 'call', function: called, arguments: isOfTwo ? [first, second] : [first] };
  });

type Trees = Readonly<Record<'any' | 'arithmetic' | 'power', Expression>>;

const trees = fc.letrec<Trees>(tie => ({
  any: fc.oneof(
    { maxDepth: 5, withCrossShrink: true },
    literal,
    name,
    negative(tie('any')),
    binary(['+', '-', '*', '/', '^'], tie('any')),
    call(tie('any')),
  ),
  arithmetic: fc.oneof(
    { maxDepth: 4, withCrossShrink: true },
    literal,
    name,
    negative(tie('arithmetic')),
    binary(['+', '-', '*', '/'], tie('arithmetic')),
    tie('power'),
  ),
  power: fc.tuple(tie('arithmetic'), fc.integer({ min: -3, max: 3 })).map(([left, exponent]): Expression => {
    const text = String(Math.abs(exponent));
    const size: Expression = { kind: 'number', text, value: parseRational(text) ?? ZERO };
    const right: Expression = exponent < 0 ? { kind: 'unary', operator: '-', operand: size } : size;
    return { kind: 'binary', operator: '^', left, right };
  }),
}));

/** Any tree of the language. */
export const anyExpression: fc.Arbitrary<Expression> = trees.any;

/** Trees of + − · / and whole powers, whose values stay exact. */
export const arithmeticExpression: fc.Arbitrary<Expression> = trees.arithmetic;

/** Polynomials in s: sums and products of powers of s with whole and decimal coefficients, as text. */
export const polynomialText: fc.Arbitrary<string> = fc
  .array(fc.tuple(fc.constantFrom('+', '-', '*'), fc.nat({ max: 99 }), fc.nat({ max: 4 }), fc.nat({ max: 3 })), {
    minLength: 1,
    maxLength: 5,
  })
  .map(factors =>
    factors
      .map(
        ([operator, c, power, outer], i) => `${i === 0 ? '' : ` ${operator} `}(${c}*s^${power} - 0.5*s + a)^${outer}`,
      )
      .join(''),
  );

const PIECES = [
  ...['a', 'k', 's', 'pi', 'sin', 'sqrt', 'min', 'atan2', 'foo', '1', '2.5', '.5', '1e5', '1.2.3', '0x1'],
  ...[
    '+',
    '-',
    '*',
    '/',
    '^',
    '(',
    ')',
    ',',
    ' ',
    '  ',
    '**',
    '--',
    '\n',
    'ω',
    '=',
    '[',
    '%',
    "'",
    '"',
    '!',
    ':',
    '\u0000',
  ],
];

/** Text of tokens in any order, most of it no expression. */
export const tokenText: fc.Arbitrary<string> = fc
  .array(fc.constantFrom(...PIECES), { maxLength: 25 })
  .map(pieces => pieces.join(''));
