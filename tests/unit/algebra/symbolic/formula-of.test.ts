import { describe, expect, test } from 'vitest';
import { Effort, formulaOf, formulaText } from '../../../../src/algebra/symbolic/index.ts';
import { functionOf, polynomialOf } from '../../../arbitraries/symbolic.ts';

const DECLARED = ['R', 'C', 'K1', 'K2', 'K3', 'Kp', 'Kd', 'G', 'beta', 'J', 'b', 'M', 'm', 'l', 'g', 'tau', 'w0'];

const written = (text: string, declared: readonly string[] = DECLARED) =>
  formulaText(formulaOf(functionOf(text), { declared }));

describe('formulas as an engineer writes them', () => {
  test.each([
    ['(-1)*b/J', '-b/J'],
    ['K2*K1/(K3*K2*K1 + 1)', 'K1*K2/(1 + K1*K2*K3)'],
    ['1/(C*R)', '1/(R*C)'],
    ['G/(C*R*(G*beta + 1))', 'G/(R*C*(1 + G*beta))'],
    ['-(b + Kd)/J', '-(Kd + b)/J'],
    ['g*(m + M)/(M*l)', 'g*(M + m)/(M*l)'],
    ['-105/tau^4', '-105/tau^4'],
    ['0*J', '0'],
    ['-J/J', '-1'],
    ['b', 'b'],
  ])('%s is written %s', (text, expected) => {
    expect(written(text)).toBe(expected);
  });

  test('a positive term leads a difference, and a minus in front turns one around', () => {
    expect(written('G - 1')).toBe('G - 1');
    expect(written('1/(1 - G)')).toBe('1/(1 - G)');
    expect(written('-Kp*(G - 1)/J')).toBe('Kp*(1 - G)/J');
    expect(written('-J - b')).toBe('-(J + b)');
    // The term that is negative may be declared first.
    expect(written('1/(J - b)')).toBe('1/(J - b)');
    expect(written('1/(J - b)', ['b', 'J'])).toBe('1/(J - b)');
    expect(written('J/(b - m)', ['m', 'b', 'J'])).toBe('J/(b - m)');
  });

  test('terms rise in degree; equals follow the order of declaration', () => {
    expect(written('J*b^2 + b + 1 + J')).toBe('1 + J + b + J*b^2');
    expect(written('b + J', ['b', 'J'])).toBe('b + J');
    expect(written('b + J', ['J', 'b'])).toBe('J + b');
    expect(written('J^2 + J*b + b^2')).toBe('J^2 + J*b + b^2');
  });

  test('what is not declared stands before the parameters, as constants do', () => {
    expect(written('b*2*pi')).toBe('2*pi*b');
  });

  test('a polynomial is factored where that is shorter', () => {
    expect(written('J*b + J*l')).toBe('J*(b + l)');
    expect(written('J^2 + 2*J*b + b^2')).toBe('(J + b)^2');
    expect(written('1/((1 + J*b)*(1 + M*m))')).toBe('1/((1 + J*b)*(1 + M*m))');
    expect(written('2 + 2*J')).toBe('2*(1 + J)');
    expect(written('J + J*b')).toBe('J*(1 + b)');
    expect(written('15 + 10*J')).toBe('5*(3 + 2*J)');
    expect(written('(J^2 - b^2)/m')).toBe('(J^2 - b^2)/m');
  });

  test('a known factor is found where nothing else would find it', () => {
    const f = functionOf('1/((1 + J^2 + b^2)*(3 + J^2 - 2*b^2))');
    // Multiplied out by hand.
    expect(formulaText(formulaOf(f, { declared: DECLARED }))).toBe('1/(3 + 4*J^2 + b^2 + J^4 - J^2*b^2 - 2*b^4)');
    const options = { declared: DECLARED, knownFactors: [polynomialOf('1 + J^2 + b^2')] };
    expect(formulaText(formulaOf(f, options))).toBe('1/((1 + J^2 + b^2)*(3 + J^2 - 2*b^2))');
  });

  test.each([
    ['G/2', 'G/2'],
    ['3*G/7', '3*G/7'],
    ['1/(2*pi)', '1/(2*pi)'],
    ['-108/(125*tau)', '-0.864/tau'],
    ['-17*w0^2/5', '-3.4*w0^2'],
    ['G*1e-12', '1e-12*G'],
    ['G*4.7e-6', '4.7e-6*G'],
    ['G*1e6', '1e6*G'],
    ['G*10000', '10000*G'],
    ['0.001*G', '0.001*G'],
    ['2^-30', '1/1073741824'],
    ['J/3 + b/7', '(7*J + 3*b)/21'],
  ])('the number in %s is written as in %s', (text, expected) => {
    expect(written(text)).toBe(expected);
  });

  test('decimals spread over a sum, and a loop shows its gain beside one', () => {
    expect(written('0.002 + 0.05*Kp')).toBe('0.002 + 0.05*Kp');
    expect(written('1 + 0.1*G')).toBe('1 + 0.1*G');
    expect(written('G/(1 + 0.05*G)')).toBe('G/(1 + 0.05*G)');
    expect(written('G/(3 + G)')).toBe('G/(3 + G)');
  });

  test('an effort that is spent leaves the formula expanded', () => {
    const effort = new Effort({ maximumOperations: 1 });
    const square = functionOf('(1 + J)^2*(1 + b)^2');
    expect(formulaText(formulaOf(square, { effort }))).not.toContain('^2*(');
    expect(formulaText(formulaOf(square))).toBe('(1 + J)^2*(1 + b)^2');
  });
});
