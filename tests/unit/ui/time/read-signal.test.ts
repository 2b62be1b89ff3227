import { describe, expect, test } from 'vitest';
import { readSignal } from '../../../../src/ui/time/read-signal.ts';

describe('a recorded signal', () => {
  test.each([
    ['commas', 't,u\n0,1\n2,3'],
    ['semicolons with decimal commas', 't;u\r\n0;1,0\r\n2;3,0\r\n'],
    ['tabs and a third column', '0\t1\tx\n2\t3\ty'],
    ['quotes', '"0","1"\n"2","3"'],
  ])('is read with %s', (_, text) => {
    expect(readSignal('a.csv', text)).toEqual({ ok: true, signal: { name: 'a.csv', time: [0, 2], values: [1, 3] } });
  });

  test('begins at t = 0, and may jump', () => {
    expect(readSignal('a.csv', '5,0\n6,0\n6,1\n7,1')).toMatchObject({
      signal: { time: [0, 1, 1, 2], values: [0, 0, 1, 1] },
    });
  });

  test.each([
    ['0,1\nx,2', 'a.csv, row 2: it does not hold a time and a value.'],
    ['0,1\n1', 'a.csv, row 2: it does not hold a time and a value.'],
    ['1,1\n0,2', 'a.csv, row 2: its time 0 lies before the one above. Sort the rows by time.'],
    ['t,u\n0,1', 'a.csv has fewer than two rows with a time and a value.'],
    ['', 'a.csv has fewer than two rows with a time and a value.'],
    [Array.from({ length: 20_001 }, (_, k) => `${k},1`).join('\n'), 'a.csv has more than 20000 rows. Leave some out.'],
  ])('%# is refused', (text, message) => {
    expect(readSignal('a.csv', text)).toEqual({ ok: false, message });
  });
});
