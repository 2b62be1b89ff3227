import { describe, expect, test } from 'vitest';
import { readWrittenBlock } from '../../../../src/diagram/write-a-block/index.ts';

function blockOf(text: string) {
  const read = readWrittenBlock(text);
  if (!read.ok) throw new Error(read.problems[0]?.message ?? 'refused');
  return read.value.block;
}

function refusalOf(text: string): string | undefined {
  const read = readWrittenBlock(text);
  return read.ok ? undefined : read.problems[0]?.message;
}

describe('what is written on paper becomes a block', () => {
  test.each([
    ['3.5', { kind: 'gain', gain: '3.5' }],
    ['K_p', { kind: 'gain', gain: 'K_p' }],
    ['-k/m', { kind: 'gain', gain: '-k/m' }],
    ['1/s', { kind: 'integrator' }],
    [' 1 / s  omega ', { kind: 'integrator', name: 'omega' }],
    ['+-', { kind: 'summer', signs: '+-' }],
    ['+ - +', { kind: 'summer', signs: '+-+' }],
    ['r>', { kind: 'input', name: 'r' }],
    ['>', { kind: 'input' }],
    ['>y', { kind: 'output', name: 'y' }],
    ['(s+2)/(s+5)', { kind: 'transfer-function', numerator: 's + 2', denominator: 's + 5' }],
    ['[s+2]/[s+5]', { kind: 'transfer-function', numerator: 's + 2', denominator: 's + 5' }],
    ['1/(s+2)*K', { kind: 'transfer-function', numerator: '1*K', denominator: 's + 2' }],
    ['K/s', { kind: 'transfer-function', numerator: 'K', denominator: 's' }],
    ['s', { kind: 'differentiator' }],
    ['2*s', { kind: 'transfer-function', numerator: '2*s', denominator: '1' }],
    ['e^(-T*s)', { kind: 'delay', time: 'T' }],
    ['e^( -0.5 * s )', { kind: 'delay', time: '0.5' }],
    ['exp(-s*T_d)', { kind: 'delay', time: 'T_d' }],
    ['e^(-s)', { kind: 'delay', time: '1' }],
    ['-1 .. 1', { kind: 'limiter', lower: '-1', upper: '1' }],
    ['-u_max..u_max', { kind: 'limiter', lower: '-u_max', upper: 'u_max' }],
    ['K_x = 3.5', { kind: 'gain', gain: 'K_x' }],
    ['1/s^2', { kind: 'transfer-function', numerator: '1', denominator: 's^2' }],
    ['(s+1)^-2', { kind: 'transfer-function', numerator: '1', denominator: '(s + 1)^2' }],
    ['K_p + K_i/s', { kind: 'transfer-function', numerator: 'K_p*s + K_i', denominator: 's' }],
  ])('%s', (text, block) => {
    expect(blockOf(text)).toEqual(block);
  });

  test('the parameters it names are listed in order, without s', () => {
    const read = readWrittenBlock('K*(T_z*s + 1)/(T*s + 1)');
    expect(read.ok && read.value.names).toEqual(['K', 'T_z', 'T']);
  });
});

test('a gain written with its value defines its parameter', () => {
  const read = readWrittenBlock('K_x = 2*a');
  expect(read.ok && read.value).toEqual({
    block: { kind: 'gain', gain: 'K_x' },
    names: ['K_x', 'a'],
    defines: { name: 'K_x', value: '2*a' },
  });
});

describe('what is no block is refused with what to write', () => {
  test('a value or a dead time with s in it, a constant that is given a value', () => {
    expect(refusalOf('K = s + 1')).toBe('"s + 1" holds s. Write a quantity without it.');
    expect(refusalOf('e^(-T*s*s)')).toBe('"T*s" holds s. Write a quantity without it.');
    expect(refusalOf('pi = 3')).toBe('pi is a constant. Choose another name.');
  });
  test('nothing', () => {
    expect(refusalOf('  ')).toBe('Write a block: 3.5, K_p, 1/s, +-, (s+2)/(s+5), r> or >y.');
  });
  test('a product without its sign', () => {
    expect(refusalOf('2 k')).toBe('"2 k" is not an expression. Write 2*k.');
  });
  test('a name with a blank', () => {
    expect(refusalOf('1/s omega dot')).toBe('"omega dot" cannot be a state\'s name. Use letters, digits and _.');
  });
  test('s inside a function', () => {
    expect(refusalOf('exp(s)')).toBe('"exp(s)" is no quotient of polynomials in s. Use + - * / and whole powers of s.');
  });
});
