import { describe, expect, test } from 'vitest';
import { type Diagram, emptyDiagram } from '../../../../src/diagram/index.ts';
import { completed, completions, sayBefore } from '../../../../src/ui/write-line/say-before.ts';

const sheet: Diagram = {
  ...emptyDiagram(),
  parameters: [
    { name: 'K_p', value: '0.5' },
    { name: 'K_i', value: '2' },
  ],
  blocks: [{ id: 'sum', kind: 'summer', signs: '+-' }],
};
const around = { sheet, parameters: sheet.parameters, from: 'integrator q' };

describe('while one types, the line says what Enter does', () => {
  test.each([
    ['', ''],
    ['K_p', 'Enter places gain K_p = 0.5, wired from integrator q'],
    ['K_x = 3.5', 'Enter places gain K_x = 3.5, wired from integrator q'],
    ['K_x', 'Enter places gain K_x, wired from integrator q. K_x is new: Enter adds it with value 1'],
    ['a*b', 'Enter places gain a*b, wired from integrator q. a, b are new: Enter adds them with value 1'],
    ['r>', 'Enter places input r'],
    ['e^(-K_i*s)', 'Enter places dead time K_i, wired from integrator q'],
    ['@sum-', 'Enter wires integrator q to summing point sum with minus'],
    ['@nothing', 'There is no block nothing yet'],
    ['2 k', ''],
  ])('%s', (text, said) => {
    expect(sayBefore(text, around)).toBe(said);
  });

  test('with nothing selected there is no wire', () => {
    expect(sayBefore('@sum', { ...around, from: null })).toBe('Select the block that the wire starts at first');
    expect(sayBefore('3', { ...around, from: null })).toBe('Enter places gain 3');
  });
});

describe('the name at the end of the line', () => {
  test('goes on to parameters, after @ to blocks, and to nothing once it is one', () => {
    expect(completions('-k', around)).toEqual(['K_p', 'K_i']);
    expect(completions('1/(K_p*K_i', around)).toEqual([]);
    expect(completions('@s', around)).toEqual(['sum']);
    expect(completions('>K', around)).toEqual([]);
    expect(completions('1/s K', around)).toEqual([]);
    expect(completions('3*', around)).toEqual([]);
  });

  test('is written out in the place of its beginning', () => {
    expect(completed('1/(2*k', 'K_p')).toBe('1/(2*K_p');
    expect(completed('3*', 'K_p')).toBe('3*');
  });
});
