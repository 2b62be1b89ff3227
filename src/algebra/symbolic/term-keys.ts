/**
 * Terms packed into a few doubles each, so that comparing, hashing and multiplying monomials is arithmetic of numbers. The
 * packing is made anew for every product or quotient from the degrees that it can reach: mixed radix, hence without
 * overflow, and exact since every word stays below 2⁵². In the manner of Kronecker's substitution (1882).
 */

/** Words stay below this, where doubles are whole and division by a place rounds down correctly. */
const WORD_LIMIT = 2 ** 52;

/** Where each variable's exponent stands in a key; keys compare, word by word, as terms do. */
export interface Packing {
  /** Words a key. */
  readonly words: number;
  /** Word of each variable, ascending. */
  readonly wordOf: readonly number[];
  /** Place value of each variable in its word. */
  readonly places: readonly number[];
}

/** The packing of exponents up to `degrees`, each at most 2³² − 1: as many variables to a word as fit, from the last. */
export function packingFor(degrees: readonly number[]): Packing {
  const places = new Array<number>(degrees.length);
  const fromEnd = new Array<number>(degrees.length);
  let place = 1;
  let word = 0;
  for (let v = degrees.length - 1; v >= 0; v--) {
    const radix = degrees[v]! + 1;
    if (place * radix > WORD_LIMIT) {
      place = 1;
      word++;
    }
    places[v] = place;
    fromEnd[v] = word;
    place *= radix;
  }
  return { words: word + 1, wordOf: fromEnd.map(position => word - position), places };
}

/** The keys of a list of terms, one after the other, `words` numbers each. */
export function packTerms(exponents: readonly number[], terms: number, packing: Packing): number[] {
  const { words, wordOf, places } = packing;
  const n = places.length;
  const keys = new Array<number>(terms * words).fill(0);
  for (let t = 0, k = 0; t < terms; t++) {
    const start = t * words;
    for (let v = 0; v < n; v++, k++) {
      const exponent = exponents[k]!;
      if (exponent !== 0) keys[start + wordOf[v]!] = keys[start + wordOf[v]!]! + exponent * places[v]!;
    }
  }
  return keys;
}

/** Appends the exponents of the key that starts at `start` to a list. */
export function unpackKey(keys: readonly number[], start: number, packing: Packing, exponents: number[]): void {
  const { wordOf, places } = packing;
  let word = -1;
  let rest = 0;
  for (let v = 0; v < places.length; v++) {
    if (wordOf[v] !== word) {
      word = wordOf[v]!;
      rest = keys[start + word]!;
    }
    const place = places[v]!;
    // Most exponents are zero: a comparison spares the division.
    const exponent = rest < place ? 0 : Math.floor(rest / place);
    rest -= exponent * place;
    exponents.push(exponent);
  }
}
