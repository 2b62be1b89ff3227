import { describe, expect, test } from 'vitest';
import { certifiedRoots, rational } from '../../../../src/algebra/index.ts';
import reference from './hard-polynomials.json' with { type: 'json' };

describe('ill-conditioned polynomials of ordinary-looking models', () => {
  test.each(reference.polynomials)(
    '$name: both parts of every root are the nearest doubles',
    ({ coefficients, roots }) => {
      const found = certifiedRoots(coefficients.map(c => rational(BigInt(c))));
      expect(found.map(({ re, im }) => [re, im])).toEqual(roots);
      for (const { multiplicity } of found) expect(multiplicity).toBe(1);
    },
  );
});
