/** Like terms gathered by key: the accumulator of products and quotients, by open addressing. */

/** Odd multipliers whose bits are spread: 2³²/φ (Knuth, TAOCP 3, 6.4), and an arbitrary second one. */
const MIX_HIGH = 0x9e3779b1;
const MIX_LOW = 0x85ebca6b;

/** Sums of coefficients by key, an entry each in order of first appearance. Grows at three quarters full. */
export class TermTable {
  /** `words` numbers an entry. */
  readonly keys: number[] = [];
  readonly sums: bigint[] = [];
  private readonly words: number;
  private slots: number[];
  private shift: number;

  constructor(words: number, expectedTerms: number) {
    const bits = Math.max(4, 33 - Math.clz32(Math.max(1, expectedTerms)));
    this.words = words;
    this.slots = new Array<number>(2 ** bits).fill(0);
    this.shift = 32 - bits;
  }

  /** Adds to the sum under the key that starts at `start` of a list; tells whether the key is new. */
  add(list: readonly number[], start: number, coefficient: bigint): boolean {
    const slot = this.slotOf(list, start);
    const entry = this.slots[slot]! - 1;
    if (entry >= 0) {
      this.sums[entry] = this.sums[entry]! + coefficient;
      return false;
    }
    for (let w = 0; w < this.words; w++) this.keys.push(list[start + w]!);
    this.sums.push(coefficient);
    this.slots[slot] = this.sums.length;
    if (this.sums.length * 4 > this.slots.length * 3) this.grow();
    return true;
  }

  /** Positive where entry e has the larger key, negative where entry f has. */
  compare(e: number, f: number): number {
    const words = this.words;
    for (let k = e * words, l = f * words, end = k + words; k < end; k++, l++) {
      const difference = this.keys[k]! - this.keys[l]!;
      if (difference !== 0) return difference;
    }
    return 0;
  }

  /** The entries, those of largest key first. */
  descendingEntries(): number[] {
    if (this.words > 1) return Array.from(this.sums, (_, e) => e).sort((e, f) => this.compare(f, e));
    // Sorted as plain doubles, the keys find their entries again: faster than a comparison by callback.
    const sorted = Array.from(new Float64Array(this.keys).sort().reverse());
    return sorted.map((_, k) => this.slots[this.slotOf(sorted, k)]! - 1);
  }

  /** The slot that holds a key (its entry + 1), or is free for it. */
  private slotOf(list: readonly number[], start: number): number {
    const { words, slots, keys } = this;
    const mask = slots.length - 1;
    let hash = 0;
    for (let w = 0; w < words; w++) {
      const word = list[start + w]!;
      hash = Math.imul(hash ^ (word | 0) ^ Math.imul(Math.floor(word / 4294967296), MIX_HIGH), MIX_LOW);
      hash ^= hash >>> 15;
    }
    let slot = Math.imul(hash, MIX_LOW) >>> this.shift;
    while (true) {
      const entry = slots[slot]! - 1;
      if (entry < 0) return slot;
      let w = 0;
      while (w < words && keys[entry * words + w] === list[start + w]) w++;
      if (w === words) return slot;
      slot = (slot + 1) & mask;
    }
  }

  private grow(): void {
    this.slots = new Array<number>(this.slots.length * 2).fill(0);
    this.shift--;
    for (let entry = 0; entry < this.sums.length; entry++) {
      this.slots[this.slotOf(this.keys, entry * this.words)] = entry + 1;
    }
  }
}
