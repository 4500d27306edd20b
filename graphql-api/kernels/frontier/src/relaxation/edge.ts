import type { Stop } from './obstacle.js';
import type { OpenPart } from './open-part.js';

/** Where the relaxation stands, and which way it is about to go. */
export interface Corner {
  /** Of each row and, last, of cost, and how it changes along the edge. */
  readonly price: Float64Array;
  readonly direction: Float64Array;
  /** Benefit less entries at the prices, of each option, and how it changes along the edge. */
  readonly worth: Float64Array;
  readonly slope: Float64Array;
  /** The best option of each class, and which options are as good. */
  readonly best: Int32Array;
  readonly isTie: Uint8Array;
  readonly tiesInClass: Int32Array;
}

/**
 * The edge that leads away from a corner of the relaxation. Along it the sum to be made least is piecewise linear: it
 * bends where another option of a class overtakes the best one, and ends where a price falls to zero.
 */
export class Edge {
  private readonly nextBreak: Float64Array;
  private readonly nextOption: Int32Array;

  constructor(
    private readonly part: OpenPart,
    private readonly corner: Corner,
  ) {
    this.nextBreak = new Float64Array(part.classCount);
    this.nextOption = new Int32Array(part.classCount);
  }

  /**
   * The least point of the edge, undefined if there is none. Changes of a class' best option on the way are made.
   *
   * @param rate how the sum changes at first
   */
  leastPoint(rate: number): Stop | undefined {
    const { part, nextBreak, nextOption } = this;
    const { best, slope, tiesInClass } = this.corner;
    const zero = this.firstZero();
    for (let k = 0; k < part.classCount; k++) this.findBreak(k);
    let slopeNow = rate;
    for (;;) {
      let k = -1;
      let distance = zero?.distance ?? Infinity;
      for (let other = 0; other < nextBreak.length; other++) {
        if (nextBreak[other] >= distance) continue;
        distance = nextBreak[other];
        k = other;
      }
      if (k < 0) return zero;
      const option = nextOption[k];
      slopeNow += slope[option] - slope[best[k]];
      // a class with ties cannot change its best option: the ties would be lost with it
      if (slopeNow >= 0 || tiesInClass[k] > 0) return { kind: 'tie', option, distance };
      best[k] = option;
      this.findBreak(k);
    }
  }

  /**
   * Whether along the direction the sum falls without end, which no portfolio in shares could follow. Only a fall well
   * beyond rounding counts: where the bounds can just be met, the sum is level in truth.
   */
  fallsForEver(bound: Float64Array): boolean {
    const { part } = this;
    const { direction, slope } = this.corner;
    let fall = 0;
    let size = 0;
    const add = (term: number): void => {
      fall += term;
      size += Math.abs(term);
    };
    for (let row = 0; row < direction.length; row++) add(bound[row] * direction[row]);
    for (let k = 0; k < part.classCount; k++) {
      add(slope.subarray(part.start[k], part.start[k + 1]).reduce(larger, -Infinity));
    }
    return fall < -SURELY * size;
  }

  /** Where the first price falls to zero. */
  private firstZero(): Stop | undefined {
    const { price, direction } = this.corner;
    let first: Stop | undefined;
    for (let row = 0; row < price.length; row++) {
      if (direction[row] >= -STILL) continue;
      const distance = price[row] / -direction[row];
      if (!first || distance < first.distance) first = { kind: 'zero', row, distance };
    }
    return first;
  }

  /** Where another option of a class overtakes the one that is best so far. */
  private findBreak(k: number): void {
    const { part, nextBreak, nextOption } = this;
    const { worth, slope, isTie } = this.corner;
    const best = this.corner.best[k];
    nextBreak[k] = Infinity;
    for (let option = part.start[k]; option < part.start[k + 1]; option++) {
      const gain = slope[option] - slope[best];
      // ties move along with the best: what tells them apart is rounding
      if (gain <= STILL || isTie[option] === 1) continue;
      const distance = Math.max(0, (worth[best] - worth[option]) / gain);
      if (distance >= nextBreak[k]) continue;
      nextBreak[k] = distance;
      nextOption[k] = option;
    }
  }
}

function larger(one: number, other: number): number {
  return Math.max(one, other);
}

const STILL = 1e-12;
const SURELY = 1e-7;
