import { describe, expect, test } from 'vitest';
import {
  createSymbolicField,
  formulaC,
  formulaOf,
  formulaPython,
  formulaText,
} from '../../../../src/algebra/symbolic/index.ts';
import { functionOf } from '../../../arbitraries/symbolic.ts';

describe('formulas on one line', () => {
  test.each([
    ['-b/J', '-b/J'],
    ['1/2', '1.0/2.0'],
    ['0', '0.0'],
    ['K^2/J^3', 'K*K/(J*J*J)'],
    ['1/K^2', '1.0/(K*K)'],
    ['K^5', 'pow(K, 5.0)'],
    ['J/(1 + K)^4', 'J/pow(1.0 + K, 4.0)'],
    ['(1 + K)^2', '(1.0 + K)*(1.0 + K)'],
    ['2*K - 3', '2.0*K - 3.0'],
    ['1e-12*K', '1e-12*K'],
    ['-3.4*w0^2', '-3.4*w0*w0'],
  ])('C computes %s as %s', (text, expected) => {
    expect(formulaC(formulaOf(functionOf(text)))).toBe(expected);
  });

  test.each([
    ['-b/J', '-b/J'],
    ['1/2', '1/2'],
    ['-K^2', '-K**2'],
    ['J/(1 + K)^4', 'J/(1 + K)**4'],
    ['3*K^2/7', '3*K**2/7'],
  ])('Python computes %s as %s', (text, expected) => {
    expect(formulaPython(formulaOf(functionOf(text)))).toBe(expected);
  });

  test('names are spelled as the target wants them', () => {
    const formula = formulaOf(functionOf('2*pi*lambda'), { declared: ['lambda'] });
    expect(formulaPython(formula, name => (name === 'pi' ? 'math.pi' : `${name}_`))).toBe('2*math.pi*lambda_');
    expect(formulaC(formula, name => (name === 'pi' ? 'M_PI' : name))).toBe('2.0*M_PI*lambda');
  });

  test('an atom that is a name or one call stands bare, anything else in parentheses', () => {
    const field = createSymbolicField();
    const text = (atom: string) => formulaText(formulaOf(field.power(field.variable(atom), 2)));
    expect(text('sqrt(2)')).toBe('sqrt(2)^2');
    expect(text('atan2(1, (2))')).toBe('atan2(1, (2))^2');
    expect(text('(1 + sqrt(2))')).toBe('(1 + sqrt(2))^2');
    expect(text('1 + sqrt(2)')).toBe('(1 + sqrt(2))^2');
    expect(text('sin(1)*cos(1)')).toBe('(sin(1)*cos(1))^2');
    expect(text('2^0.5')).toBe('(2^0.5)^2');
  });

  test('a product of atoms and a sum reads back as itself', () => {
    const field = createSymbolicField();
    const atom = field.variable('sqrt(2)*K');
    const f = field.divide(field.one, field.multiply(atom, field.add(field.one, atom)));
    expect(formulaText(formulaOf(f))).toBe('1/((sqrt(2)*K)*(1 + (sqrt(2)*K)))');
  });
});
