import type { Deviations } from './deviations.js';

/**
 * How far the changes of the classes from p on can still move the wide rows of an enumeration and, last, the cost: up
 * and down, by so much at most, and by so much at most for each unit of loss. The figures of class p stand at
 * p × width; those of class `classCount` are nought.
 */
export class Reach {
  readonly width: number;
  readonly up: Float64Array;
  readonly down: Float64Array;
  readonly upPerLoss: Float64Array;
  readonly downPerLoss: Float64Array;

  constructor({ classCount, start, loss, wideRow, wideChange, costChange }: Deviations) {
    const wide = wideRow.length;
    const width = wide + 1;
    this.width = width;
    const figures = (): Float64Array => new Float64Array((classCount + 1) * width);
    this.up = figures();
    this.down = figures();
    this.upPerLoss = figures();
    this.downPerLoss = figures();
    for (let p = classCount - 1; p >= 0; p--) {
      for (let figure = 0; figure < width; figure++) {
        const at = p * width + figure;
        let rise = 0;
        let fall = 0;
        let risePerLoss = this.upPerLoss[at + width];
        let fallPerLoss = this.downPerLoss[at + width];
        for (let change = start[p]; change < start[p + 1]; change++) {
          const moved = figure < wide ? wideChange[change * wide + figure] : costChange[change];
          if (moved > rise) rise = moved;
          else if (-moved > fall) fall = -moved;
          // a change that loses nothing may be made at any loss left: the quotient is infinite then
          if (moved > 0) risePerLoss = Math.max(risePerLoss, moved / loss[change]);
          else if (moved < 0) fallPerLoss = Math.max(fallPerLoss, -moved / loss[change]);
        }
        this.up[at] = this.up[at + width] + rise;
        this.down[at] = this.down[at + width] + fall;
        this.upPerLoss[at] = risePerLoss;
        this.downPerLoss[at] = fallPerLoss;
      }
    }
  }
}
