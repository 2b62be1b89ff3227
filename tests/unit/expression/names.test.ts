import { describe, expect, test } from 'vitest';
import {
  FUNCTION_NAMES,
  hasLaplaceVariable,
  namesIn,
  nearestName,
  parameterNameFault,
  parseExpression,
  renameIn,
} from '../../../src/expression/index.ts';
import { valueOf } from '../results.ts';

describe('a parameter’s name', () => {
  test('is letters, digits and underscores after a letter', () => {
    for (const name of ['k', 'K_p', 'omega2', 'sE', 'constructor', 'e1', 'mod']) {
      expect(parameterNameFault(name)).toBeNull();
    }
  });

  test('is not one where it is written otherwise', () => {
    for (const name of ['', '2k', '_k', 'k p', 'ω', 'k-p', 'k\n']) {
      expect(parameterNameFault(name)).toBe(
        'A parameter’s name begins with a letter and has letters, digits and underscores only.',
      );
    }
  });

  test('is at most 200 characters long', () => {
    expect(parameterNameFault('k'.repeat(200))).toBeNull();
    expect(parameterNameFault('k'.repeat(201))).toBe('A parameter’s name has at most 200 characters.');
  });

  test('is not one that means something else', () => {
    expect(parameterNameFault('s')).toBe('s is the Laplace variable. Choose another name.');
    expect(parameterNameFault('pi')).toBe('pi is a constant. Choose another name.');
    expect(parameterNameFault('e')).toBe('e is a constant. Choose another name.');
    for (const name of FUNCTION_NAMES) {
      expect(parameterNameFault(name)).toBe(`${name} is a function. Choose another name.`);
    }
  });
});

test('the functions are those of the file format, in its order', () => {
  expect(FUNCTION_NAMES.join(' ')).toBe(
    'sqrt exp ln log10 sin cos tan asin acos atan atan2 sinh cosh tanh abs min max',
  );
});

test('the names of an expression are its parameters, each once, in order', () => {
  const expression = valueOf(parseExpression('b*sin(a) + b^2*pi - e*s + c'));
  expect(namesIn(expression)).toEqual(['b', 'a', 'c']);
  expect(hasLaplaceVariable(expression)).toBe(true);
  expect(hasLaplaceVariable(valueOf(parseExpression('sin(a)')))).toBe(false);
});

describe('renaming in a text', () => {
  test.each([
    ['k*k2 + kk/k', 'K*k2 + kk/K'],
    ['2e5*k', '2e5*K'],
    ['  k +\n( k )', '  K +\n( K )'],
    ['2 k is no expression', '2 K is no expression'],
    ['3k', '3K'],
  ])('%s becomes %s', (text, expected) => {
    expect(renameIn(text, 'k', 'K')).toBe(expected);
  });

  test('leaves the exponent of a number alone', () => {
    expect(renameIn('1e5 + 2e + e5', 'e5', 'x')).toBe('1e5 + 2e + x');
  });

  test('takes the new name as it is', () => {
    expect(renameIn('a', 'a', '$&')).toBe('$&');
  });
});

describe('the nearest name', () => {
  test.each([
    ['omgea', 'omega'], // neighbours swapped
    ['omeg', 'omega'], // one left out
    ['omegaa', 'omega'], // one too many
    ['omeha', 'omega'], // one changed
    ['OMEGA', 'omega'],
    ['kp', 'K_p'],
  ])('to %s is %s', (name, expected) => {
    expect(nearestName(name, ['x', 'omega', 'K_p'])).toBe(expected);
  });

  test('is none where two slips lie between, nor among short names', () => {
    expect(nearestName('omga2', ['omega'])).toBeNull();
    expect(nearestName('x', ['y'])).toBeNull();
    expect(nearestName('omega', ['omega'])).toBeNull();
  });
});
