import { expect, test } from 'vitest';
import { responseCsv } from '../../../../src/ui/time/response-csv.ts';

test('curves are columns over one time, a value that is none an empty cell', () => {
  const time = [0, 0.1];
  const curves = [
    { label: 'linear', time, values: [1, 2.5] },
    { label: 'kept, "1"', time, values: [Number.NaN, -3] },
  ];
  expect(responseCsv('y', curves)).toBe('t,y linear,"y kept, ""1"""\r\n0,1,\r\n0.1,2.5,-3\r\n');
});

test('one curve bears the output’s name alone, and what a spreadsheet would compute is text', () => {
  expect(responseCsv('=y', [{ label: 'linear', time: [0], values: [1] }])).toBe('t, =y\r\n0,1\r\n');
});
