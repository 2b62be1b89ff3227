/** Complex numbers of the self-check, as plain pairs. */

export interface Complex {
  readonly re: number;
  readonly im: number;
}

export const ZERO: Complex = { re: 0, im: 0 };
export const ONE: Complex = { re: 1, im: 0 };

/** The real number as a complex one. */
export function real(re: number): Complex {
  return { re, im: 0 };
}

/** a + b. */
export function add(a: Complex, b: Complex): Complex {
  return { re: a.re + b.re, im: a.im + b.im };
}

/** a − b. */
export function subtract(a: Complex, b: Complex): Complex {
  return { re: a.re - b.re, im: a.im - b.im };
}

/** a · b. */
export function multiply(a: Complex, b: Complex): Complex {
  return { re: a.re * b.re - a.im * b.im, im: a.re * b.im + a.im * b.re };
}

/** a / b, scaled so that the square of |b| neither over- nor underflows (Smith 1962, Comm. ACM 5). */
export function divide(a: Complex, b: Complex): Complex {
  if (Math.abs(b.re) >= Math.abs(b.im)) {
    const ratio = b.im / b.re;
    const size = b.re + b.im * ratio;
    return { re: (a.re + a.im * ratio) / size, im: (a.im - a.re * ratio) / size };
  }
  const ratio = b.re / b.im;
  const size = b.re * ratio + b.im;
  return { re: (a.re * ratio + a.im) / size, im: (a.im * ratio - a.re) / size };
}

/** |a|. */
export function modulus(a: Complex): number {
  return Math.hypot(a.re, a.im);
}
