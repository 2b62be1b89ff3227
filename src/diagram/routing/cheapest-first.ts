/**
 * A queue that gives the entry of least cost first: a binary heap (Williams 1964). Among equal costs the latest comes
 * first, so that a search goes on where it is deepest.
 */

/** Entries are whole numbers; the same entry may stand in it more than once. */
export class CheapestFirst {
  private costs: Float64Array = new Float64Array(1024);
  private entries: Int32Array = new Int32Array(1024);
  private ages: Int32Array = new Int32Array(1024);
  private age = 0;
  private count = 0;

  clear(): void {
    this.count = 0;
    this.age = 0;
  }

  push(entry: number, cost: number): void {
    if (this.count === this.costs.length) this.grow();
    let hole = this.count;
    this.count += 1;
    const age = this.age;
    this.age += 1;
    while (hole > 0) {
      const above = (hole - 1) >> 1;
      if (this.costs[above]! < cost) break;
      this.move(above, hole);
      hole = above;
    }
    this.costs[hole] = cost;
    this.entries[hole] = entry;
    this.ages[hole] = age;
  }

  /** The cheapest entry, taken out; −1 where there is none. */
  pop(): number {
    if (this.count === 0) return -1;
    const first = this.entries[0]!;
    this.count -= 1;
    const cost = this.costs[this.count]!;
    const entry = this.entries[this.count]!;
    const age = this.ages[this.count]!;
    let hole = 0;
    for (;;) {
      let below = 2 * hole + 1;
      if (below >= this.count) break;
      if (below + 1 < this.count && this.isBefore(below + 1, this.costs[below]!, this.ages[below]!)) below += 1;
      if (!this.isBefore(below, cost, age)) break;
      this.move(below, hole);
      hole = below;
    }
    this.costs[hole] = cost;
    this.entries[hole] = entry;
    this.ages[hole] = age;
    return first;
  }

  private isBefore(place: number, cost: number, age: number): boolean {
    const own = this.costs[place]!;
    return own < cost || (own === cost && this.ages[place]! > age);
  }

  private move(from: number, to: number): void {
    this.costs[to] = this.costs[from]!;
    this.entries[to] = this.entries[from]!;
    this.ages[to] = this.ages[from]!;
  }

  private grow(): void {
    const larger = <T extends Float64Array | Int32Array>(old: T, fresh: T): T => {
      fresh.set(old);
      return fresh;
    };
    const size = 2 * this.costs.length;
    this.costs = larger(this.costs, new Float64Array(size));
    this.entries = larger(this.entries, new Int32Array(size));
    this.ages = larger(this.ages, new Int32Array(size));
  }
}
