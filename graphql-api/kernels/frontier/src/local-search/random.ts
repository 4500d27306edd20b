/**
 * Seeded pseudo-random numbers: a 32-bit counter stepped by the golden ratio and mixed by two multiply-xorshift
 * rounds (Steele, Lea, Flood 2014, "Fast splittable pseudorandom number generators", 32-bit constants of
 * MurmurHash3's finaliser; from memory). Not for secrets.
 */
export class Random {
  private state: number;

  constructor(seed: number) {
    // both halves of a seed above 2^32 count
    this.state = (seed ^ Math.imul(Math.floor(seed / 0x1_0000_0000), 0x85eb_ca6b)) >>> 0;
  }

  /** A whole number from 0 up to, not including, `bound`. */
  below(bound: number): number {
    return Math.floor(this.fraction() * bound);
  }

  /** A number from 0 up to, not including, 1, in steps of 2^-32. */
  fraction(): number {
    this.state = (this.state + 0x9e37_79b9) >>> 0;
    let mixed = this.state;
    mixed = Math.imul(mixed ^ (mixed >>> 16), 0x85eb_ca6b);
    mixed = Math.imul(mixed ^ (mixed >>> 13), 0xc2b2_ae35);
    return ((mixed ^ (mixed >>> 16)) >>> 0) / 0x1_0000_0000;
  }
}
