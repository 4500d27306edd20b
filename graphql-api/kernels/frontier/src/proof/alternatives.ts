import { compileModel } from '../model/compile-model.js';
import { picksOf } from '../model/working-portfolio.js';
import { totalsOf, type Picks } from '../problem/feasible.js';
import type { Problem } from '../problem/problem.js';
import { wholeModel } from '../relaxation/narrow-part.js';
import type { FrontierPoint } from '../search.js';
import type { Goal } from './goal.js';
import { OpenNode } from './open-node.js';
import { precisionOf } from './precision.js';
import type { Gap, Precision, Stretch, Tangent } from './step-line.js';
import { WidestFirst } from './widest-first.js';

export interface Alternatives {
  /** Portfolios with just the benefit and cost of the point, the given one among them. */
  readonly count: number;
  /** The best portfolio of that cost that has less benefit, if it still has more than `above`. */
  readonly nextBest: FrontierPoint | undefined;
  /** False: the effort was spent before all had been looked through, so there may be more and better ones. */
  readonly isExact: boolean;
}

export interface AlternativesSettings {
  /** Benefit that a next-best portfolio has to pass: that of the next point down, which costs less. 0 if left out. */
  readonly above?: number;
  /** Branches to look at; ten million if left out. */
  readonly effort?: number;
}

/**
 * The other portfolios at a point of the front. The point is no worse than any portfolio of its cost, so these are its
 * equals and what comes next at that very cost; whatever costs less is at best the next point down.
 */
export function alternativesAt(
  problem: Problem,
  picks: Picks,
  { above = 0, effort = 10_000_000 }: AlternativesSettings = {},
): Alternatives {
  const { benefit, cost } = totalsOf(problem, picks);
  // the problem as it is: what a reduction leaves out may be part of a next-best portfolio
  const model = compileModel(problem);
  const part = model && wholeModel(model, cost, cost);
  if (!model || !part) return { count: 0, nextBest: undefined, isExact: true };
  const goal = new AlternativesGoal({ benefit, cost }, above, precisionOf(model));
  const open = new WidestFirst<OpenNode>();
  open.add(Infinity, new OpenNode(part, { height: Number.MAX_VALUE, slope: 0 }));
  let spent = 0;
  while (open.size > 0 && spent < effort) {
    const outcome = open.take()!.work(goal);
    spent += outcome.effort;
    for (const child of outcome.children) open.add(child.gap(goal), child);
  }
  const { nextBest } = goal;
  return {
    count: goal.count,
    nextBest: nextBest && { benefit: nextBest.benefit, cost, picks: picksOf(model, nextBest.chosen) },
    isExact: open.size === 0,
  };
}

/** Wants the equals of a point, each once, and of what has less benefit only what is better than all met so far. */
class AlternativesGoal implements Goal {
  nextBest: { readonly benefit: number; readonly chosen: Int32Array } | undefined;
  private readonly equals = new Set<string>();

  constructor(
    private readonly point: { readonly benefit: number; readonly cost: number },
    private readonly above: number,
    private readonly precision: Precision,
  ) {}

  get count(): number {
    return this.equals.size;
  }

  gapBelow({ height, slope }: Tangent, { from, to }: Stretch): Gap | undefined {
    const { step, slack } = this.precision;
    const asked = Math.min(this.point.benefit, (this.nextBest?.benefit ?? this.above) + step);
    const gap = height + slope * to - asked + slack;
    return gap < 0 ? undefined : { from, to, gap };
  }

  offer(cost: number, benefit: number, choose: () => Int32Array): boolean {
    if (cost !== this.point.cost) return false;
    if (benefit === this.point.benefit) {
      this.equals.add(choose().join());
      return false;
    }
    if (benefit > this.point.benefit || benefit <= (this.nextBest?.benefit ?? this.above)) return false;
    this.nextBest = { benefit, chosen: choose() };
    return true;
  }
}
