/** Expressions of format.md as expressions of C and Python: the same operators but the power, and the functions' names there. */

import { type Expression, type FunctionName, fold } from '../../expression/index.ts';

/** What an expression needs to know of the language that it is written in. */
export interface CodeLanguage {
  readonly number: (text: string) => string;
  /** A parameter, `pi` or `e`. */
  readonly name: (name: string) => string;
  readonly power: (base: string, exponent: string) => string;
  readonly call: (name: FunctionName, values: readonly string[]) => string;
}

/** The expression in a language; every operation in parentheses, so that no rule of precedence is relied on. */
export function expressionCode(expression: Expression, language: CodeLanguage): string {
  const written = fold<string>(expression, (node, parts) => {
    const [first = '', second = ''] = parts;
    switch (node.kind) {
      case 'number':
        return language.number(node.text);
      case 'name':
        return language.name(node.name);
      case 'unary':
        return `(-${first})`;
      case 'call':
        return language.call(node.function, parts);
      case 'binary':
        return node.operator === '^' ? language.power(first, second) : `(${first} ${node.operator} ${second})`;
      default:
        return node satisfies never;
    }
  });
  return written;
}

const SAME_IN_MATH = [
  'sqrt',
  'exp',
  'log10',
  'sin',
  'cos',
  'tan',
  'asin',
  'acos',
  'atan',
  'atan2',
  'sinh',
  'cosh',
  'tanh',
];

/** Python 3 with its module `math`; a number is written so that whole ones divide truly. */
export function pythonLanguage(nameOf: (name: string) => string): CodeLanguage {
  return {
    number: text => text,
    name: name => (name === 'pi' || name === 'e' ? `math.${name}` : nameOf(name)),
    power: (base, exponent) => `(${base} ** ${exponent})`,
    call: (name, values) => {
      const list = values.join(', ');
      if (name === 'ln') return `math.log(${list})`;
      if (SAME_IN_MATH.includes(name)) return `math.${name}(${list})`;
      return values.length === 1 && name !== 'abs' ? list : `${name}(${list})`; // abs, min and max are built in
    },
  };
}

/** ISO C (C99) with math.h, all in doubles; ISO C has no name for pi and e. */
export function cLanguage(nameOf: (name: string) => string): CodeLanguage {
  return {
    number: text => (/[.eE]/.test(text) ? text : `${text}.0`),
    name: name => (name === 'pi' ? '3.14159265358979323846' : name === 'e' ? '2.71828182845904523536' : nameOf(name)),
    power: (base, exponent) => `pow(${base}, ${exponent})`,
    call: (name, values) => {
      if (name === 'ln') return `log(${values.join(', ')})`;
      if (name === 'abs') return `fabs(${values.join(', ')})`;
      if (name === 'min' || name === 'max') return values.reduce((a, b) => `f${name}(${a}, ${b})`);
      return `${name}(${values.join(', ')})`;
    },
  };
}
