import type { FoundPortfolio } from './proof-task.js';
import type { Gap, Precision, StepLine, Stretch, Tangent } from './step-line.js';

/** What a proof is after: which portfolios it still wants, and where below a tangent they can lie. */
export interface Goal {
  /**
   * Where portfolios that are still wanted may lie, given that none of the part lies above the tangent, and how far
   * below the tangent at most. Undefined: nowhere.
   */
  gapBelow(tangent: Tangent, stretch: Stretch): Gap | undefined;
  /** Takes a feasible portfolio in; false if it is not wanted. */
  offer(cost: number, benefit: number, choose: () => Int32Array): boolean;
}

/** Wants every portfolio above the step line of what is known: the points of the front. */
export class FrontierGoal implements Goal {
  readonly found: FoundPortfolio[] = [];

  constructor(
    readonly line: StepLine,
    private readonly precision: Precision,
  ) {}

  gapBelow(tangent: Tangent, stretch: Stretch): Gap | undefined {
    return this.line.widestGap(tangent, stretch, this.precision);
  }

  offer(cost: number, benefit: number, choose: () => Int32Array): boolean {
    if (!this.line.raise(cost, benefit)) return false;
    this.found.push({ cost, benefit, chosen: choose() });
    return true;
  }
}
