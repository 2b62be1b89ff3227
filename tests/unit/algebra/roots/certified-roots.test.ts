import { describe, expect, test } from 'vitest';
import {
  addRationals,
  certifiedRoots,
  findCertifiedRoots,
  multiplyPolynomials,
  type Polynomial,
  parseRational,
  productOfPolynomials,
  rational,
  ZERO,
} from '../../../../src/algebra/index.ts';
import { poly } from '../as-written.ts';

/** Roots as `re im multiplicity`. */
function listed(p: Polynomial): [number, number, number][] {
  return certifiedRoots(p).map(({ re, im, multiplicity }) => [re, im, multiplicity]);
}

/** (s + 1)(s + 2) … (s + n). */
function wilkinson(n: number): Polynomial {
  return productOfPolynomials(Array.from({ length: n }, (_, i) => poly(`1 ${i + 1}`)));
}

describe('degenerate polynomials', () => {
  test('a constant and zero have no roots', () => {
    expect([certifiedRoots(poly('7')), certifiedRoots([])]).toEqual([[], []]);
  });

  test('roots at zero are counted and exact', () => {
    expect(certifiedRoots(poly('5 0 0 0'))).toEqual([{ re: 0, im: 0, multiplicity: 3, radius: 0 }]);
  });

  test('a rational root is the nearest double, and its radius says whether that is exact', () => {
    expect(certifiedRoots(poly('4 3'))).toEqual([{ re: -0.75, im: 0, multiplicity: 1, radius: 0 }]);
    const [third] = certifiedRoots(poly('3 -1'));
    expect(third?.re).toBe(1 / 3);
    expect(third?.radius).toBeGreaterThanOrEqual(2 ** -55);
    expect(third?.radius).toBeLessThan(2 ** -54);
  });
});

describe('published and closed-form roots', () => {
  test("Wilkinson's polynomial has the roots −1 … −20, each the double itself", () => {
    expect(listed(wilkinson(20))).toEqual(Array.from({ length: 20 }, (_, i) => [-1 - i, 0, 1]));
  });

  test('its perturbation by 2⁻²³ in the second coefficient has the roots of the published table', () => {
    // Wilkinson 1963, Rounding Errors in Algebraic Processes, p. 42 (table from memory, nine decimals).
    const p = [...wilkinson(20)];
    p[1] = addRationals(p[1] ?? ZERO, rational(1n, 2n ** 23n));
    const table = [
      '-1.000000000 0.000000000',
      '-2.000000000 0.000000000',
      '-3.000000000 0.000000000',
      '-4.000000000 0.000000000',
      '-4.999999928 0.000000000',
      '-6.000006944 0.000000000',
      '-6.999697234 0.000000000',
      '-8.007267603 0.000000000',
      '-8.917250249 0.000000000',
      '-10.095266145 0.643500904',
      '-10.095266145 -0.643500904',
      '-11.793633881 1.652329728',
      '-11.793633881 -1.652329728',
      '-13.992358137 2.518830070',
      '-13.992358137 -2.518830070',
      '-16.730737466 2.812624894',
      '-16.730737466 -2.812624894',
      '-19.502439400 1.940330347',
      '-19.502439400 -1.940330347',
      '-20.846908101 0.000000000',
    ];
    expect(certifiedRoots(p).map(({ re, im }) => `${re.toFixed(9)} ${im.toFixed(9)}`)).toEqual(table);
  });

  test('the Legendre polynomial of degree 5 has its closed-form roots (Abramowitz & Stegun 1964, table 25.4)', () => {
    const roots = listed(poly('63 0 -70 0 15 0'));
    const outer = Math.sqrt(5 + 2 * Math.sqrt(10 / 7)) / 3;
    const inner = Math.sqrt(5 - 2 * Math.sqrt(10 / 7)) / 3;
    expect(roots.map(([re]) => re.toFixed(14))).toEqual([outer, inner, 0, -inner, -outer].map(x => x.toFixed(14)));
    expect(roots.map(([re]) => re.toFixed(9)).slice(0, 2)).toEqual(['0.906179846', '0.538469310']);
  });

  test('the reversed Bessel polynomial of degree 3, s³ + 6s² + 15s + 15, has the poles of the filter tables', () => {
    // −2.3222 and −1.8389 ± 1.7544j: printed in every table of Thomson filters normalised to unit delay.
    const roots = listed(poly('1 6 15 15')).map(([re, im]) => `${re.toFixed(4)} ${im.toFixed(4)}`);
    expect(roots).toEqual(['-1.8389 1.7544', '-1.8389 -1.7544', '-2.3222 0.0000']);
  });

  test('√2 and its like come out as the nearest double (IEEE square root)', () => {
    for (const x of [2, 3, 5, 7, 1e6 + 1, 12345]) {
      expect(listed(poly(`1 0 -${x}`))).toEqual([
        [Math.sqrt(x), 0, 1],
        [-Math.sqrt(x), 0, 1],
      ]);
      expect(listed(poly(`1 0 ${x}`))).toEqual([
        [0, Math.sqrt(x), 1],
        [0, -Math.sqrt(x), 1],
      ]);
    }
  });
});

describe('roots on the imaginary axis', () => {
  test('they have a real part of zero, beside others and with multiplicity', () => {
    const p = productOfPolynomials([poly('1 0 4'), poly('1 0 4'), poly('1 0 2'), poly('1 3'), poly('1 1 1')]);
    expect(listed(p)).toEqual([
      [0, 2, 2],
      [0, Math.SQRT2, 1],
      [0, -Math.SQRT2, 1],
      [0, -2, 2],
      [-0.5, Math.sqrt(3) / 2, 1],
      [-0.5, -Math.sqrt(3) / 2, 1],
      [-3, 0, 1],
    ]);
  });

  test('the fourth roots of 4 are on the axis or off it as they should be, in one irreducible-looking factor', () => {
    expect(listed(poly('1 0 0 0 -4'))).toEqual([
      [Math.SQRT2, 0, 1],
      [0, Math.SQRT2, 1],
      [0, -Math.SQRT2, 1],
      [-Math.SQRT2, 0, 1],
    ]);
    expect(listed(poly('1 0 0 0 4'))).toEqual([
      [1, 1, 1],
      [1, -1, 1],
      [-1, 1, 1],
      [-1, -1, 1],
    ]);
  });

  test('a pair that misses the axis by 1e-40 is seen to do so, on either side', () => {
    for (const sign of ['', '-']) {
      const [upper] = certifiedRoots(multiplyPolynomials(poly(`1 ${sign}2e-40 1`), poly('1 5')));
      expect([upper?.re, upper?.im]).toEqual([sign === '' ? -1e-40 : 1e-40, 1]);
    }
  });
});

describe('hard neighbourhoods', () => {
  test('roots 1e-12 and 1e-30 apart are told apart', () => {
    const p = productOfPolynomials([poly('1 1'), poly('1 1.000000000001'), poly('1 1.000000000000000000000000000001')]);
    expect(listed(p)).toEqual([
      [-1, 0, 1],
      [-1, 0, 1],
      [-1.000000000001, 0, 1],
    ]);
    const spread = productOfPolynomials([poly('1 1'), poly('1 1.000000000000000000000000000001')]);
    expect(certifiedRoots(spread)).toHaveLength(2);
  });

  test('s⁴ + 4s³ + 6s² + 4s + 1 + 1e-40 has the four roots −1 + 1e-10 · (±1 ± j)/√2', () => {
    const roots = listed(poly(`1 4 6 4 ${1n}.${'0'.repeat(39)}1`));
    const d = 1e-10 * Math.SQRT1_2;
    expect(roots.map(([re]) => re)).toEqual([-1 + d, -1 + d, -1 - d, -1 - d]);
    for (const [, im] of roots) expect(Math.abs(Math.abs(im) - d)).toBeLessThan(1e-25);
  });

  test('magnitudes from 1e-200 to 1e200 in one polynomial are all found', () => {
    const p = productOfPolynomials(['1e-200', '1e-9', '1', '1e9', '1e200'].map(x => poly(`1 ${x}`)));
    expect(listed(p).map(([re]) => re)).toEqual([-1e-200, -1e-9, -1, -1e9, -1e200]);
  });

  test('a pair 1e160 times nearer to the axis than to zero keeps its imaginary part to the last bit', () => {
    // (s − 9e80)² + (6.4e-78)²: squares of such distances underflow in doubles.
    const pair = poly(`1 -18e80 ${81n * 10n ** 160n}`);
    const p = [...pair.slice(0, 2), addRationals(pair[2] ?? ZERO, parseRational('40.96e-156') ?? ZERO)];
    expect(listed(p)).toEqual([
      [9e80, 6.4e-78, 1],
      [9e80, -6.4e-78, 1],
    ]);
    expect(listed(multiplyPolynomials(p, poly('1 3'))).slice(0, 2)).toEqual(listed(p));
  });

  test('what is beyond the doubles becomes infinite or the least double, never zero', () => {
    expect(listed(multiplyPolynomials(poly('1 1e-330'), poly('1 -1e330')))).toEqual([
      [Number.POSITIVE_INFINITY, 0, 1],
      [-Number.MIN_VALUE, 0, 1],
    ]);
    expect(listed(poly('1 1e-330'))).toEqual([[-Number.MIN_VALUE, 0, 1]]);
    expect(certifiedRoots(poly('1 1e330'))[0]?.radius).toBe(Number.POSITIVE_INFINITY);
  });

  test('a root in the middle between two doubles goes to the even one', () => {
    // (s + 1 + 2⁻⁵³)(s² − 2) once as a product, so that the middle is met inside a factor of degree 3 as well.
    const middle: Polynomial = [rational(2n ** 53n), rational(2n ** 53n + 1n)];
    const p = multiplyPolynomials(middle, poly('1 1 -2'));
    expect(listed(p).map(([re]) => re)).toEqual([1, -1, -2]);
    expect(listed(middle)).toEqual([[-1, 0, 1]]);
    const odd: Polynomial = [rational(2n ** 53n), rational(2n ** 53n + 3n)];
    expect(listed(multiplyPolynomials(odd, poly('1 1 -2'))).map(([re]) => re)).toEqual([1, -1 - 2 ** -51, -2]);
  });

  test('thirty-two lags of 1.00, 1.01, 1.02 … in a loop converge to roots that multiply back to the constant term', () => {
    const lags = productOfPolynomials(
      Array.from({ length: 32 }, (_, i) => [rational(1n), rational(BigInt(100 + i), 100n)]),
    );
    const p = [...lags];
    p[32] = addRationals(p[32] ?? ZERO, rational(1n, 1000n));
    const roots = certifiedRoots(p);
    expect(roots).toHaveLength(32);
    const logarithm = roots.reduce((sum, { re, im }) => sum + Math.log(Math.hypot(re, im)), 0);
    const expected = Math.log(Number(((p[32]?.n ?? 0n) * 10n ** 20n) / (p[32]?.d ?? 1n)) / 1e20);
    expect(Math.abs(logarithm - expected)).toBeLessThan(1e-13);
  });
});

describe('products', () => {
  test('factors with roots in common give the same answer as their product', () => {
    const factors = [poly('1 3 2'), poly('1 2'), poly('1 0 1'), poly('1 1 1 1'), poly('2 4'), poly('1 0')];
    expect(findCertifiedRoots(factors)).toEqual(certifiedRoots(productOfPolynomials(factors)));
    expect(findCertifiedRoots(factors)?.map(root => root.multiplicity)).toEqual([2, 1, 2, 2, 3]);
  });

  test('no factor is the constant one', () => {
    expect(findCertifiedRoots([])).toEqual([]);
  });
});

describe('failure', () => {
  test('roots 2⁻¹⁰⁰⁰ apart are reported as not separated', () => {
    const close: Polynomial[] = [poly('1 1'), [rational(2n ** 1000n), rational(2n ** 1000n + 1n)]];
    const p = productOfPolynomials(close);
    expect(findCertifiedRoots([p])).toBeNull();
    expect(() => certifiedRoots(p)).toThrow('roots that are not separated within 8192 bits');
    expect(findCertifiedRoots(close)?.map(root => root.re)).toEqual([-1, -1]);
  });
});
