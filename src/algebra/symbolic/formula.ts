/**
 * The written shape of a formula, apart from any notation: sign, numerator and denominator as products of a number,
 * parameters and sums, everything in its order on paper. The notations (text, LaTeX, MathML, C, Python) only spell it out.
 */

/** integer · 10^−decimals: a whole number or a terminating decimal. */
export interface WrittenNumber {
  readonly integer: bigint;
  readonly decimals: number;
}

/** A parameter, or an opaque atom such as `sqrt(2)`, to a positive power. */
export interface WrittenPower {
  readonly name: string;
  readonly exponent: number;
}

/** ± number · Π powers; the number is positive, and left out on paper where it is one and there are powers. */
export interface WrittenTerm {
  readonly sign: 1 | -1;
  readonly number: WrittenNumber;
  readonly powers: readonly WrittenPower[];
}

/** At least two terms, added. */
export type WrittenSum = readonly WrittenTerm[];

/** number · Π powers · Π sums ^ exponent, the number positive. */
export interface WrittenProduct {
  readonly number: WrittenNumber;
  readonly powers: readonly WrittenPower[];
  readonly sums: readonly { readonly terms: WrittenSum; readonly exponent: number }[];
}

/** sign · numerator / denominator; zero has the number 0 for its numerator. */
export interface Formula {
  readonly sign: 1 | -1;
  readonly numerator: WrittenProduct;
  /** The number one alone where nothing is divided. */
  readonly denominator: WrittenProduct;
}

/** The number one. */
export const WRITTEN_ONE: WrittenNumber = { integer: 1n, decimals: 0 };

/** Whether a number is one, which a product leaves out. */
export function isWrittenOne({ integer, decimals }: WrittenNumber): boolean {
  return integer === 1n && decimals === 0;
}

/** How many things stand in a product side by side; 0 for the number one alone. */
export function itemCount({ number, powers, sums }: WrittenProduct): number {
  return (isWrittenOne(number) ? 0 : 1) + powers.length + sums.length;
}

/** The sum that a product consists of, null where there is anything beside it. */
export function loneSum(product: WrittenProduct): WrittenSum | null {
  const only = product.sums[0];
  return only !== undefined && only.exponent === 1 && itemCount(product) === 1 ? only.terms : null;
}

/** Digits that a power of ten has to save before it is preferred to them: 10000 and 0.001 stay, 100000 is 1e5. */
const WORTHWHILE_SAVING = 3;

/** A positive number in digits, with a power of ten where that is much shorter: `0.864`, `1e-12`, `4.7e-6`, `1e6`. */
export function numberParts({ integer, decimals }: WrittenNumber): {
  readonly digits: string;
  readonly powerOfTen: number;
} {
  const plain = plainDigits(integer.toString(), decimals);
  const significant = integer.toString().replace(/0+$/, '');
  const powerOfTen = integer.toString().length - 1 - decimals;
  const digits = plainDigits(significant, significant.length - 1);
  const saved = plain.length - `${digits}e${powerOfTen}`.length;
  return integer !== 0n && saved >= WORTHWHILE_SAVING ? { digits, powerOfTen } : { digits: plain, powerOfTen: 0 };
}

function plainDigits(digits: string, decimals: number): string {
  if (decimals <= 0) return digits;
  const padded = digits.padStart(decimals + 1, '0');
  return `${padded.slice(0, -decimals)}.${padded.slice(-decimals)}`;
}

/** n / d as a terminating decimal, both positive and without a common divisor; null where there is none. */
export function terminatingDecimal(n: bigint, d: bigint): WrittenNumber | null {
  const twos = multiplicityOf(2n, d);
  const fives = multiplicityOf(5n, d);
  if (2n ** BigInt(twos) * 5n ** BigInt(fives) !== d) return null;
  const decimals = Math.max(twos, fives);
  return { integer: (n * 10n ** BigInt(decimals)) / d, decimals };
}

function multiplicityOf(prime: bigint, value: bigint): number {
  let multiplicity = 0;
  for (let rest = value; rest % prime === 0n; rest /= prime) multiplicity++;
  return multiplicity;
}
