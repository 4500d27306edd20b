import type { Amount } from '../../lib/money';
import { toBound } from './bound';
import type { Bound } from './bound';
import { rodScale } from './frontier-scale';
import type { RodScale } from './frontier-scale';
import { toPortfolios } from './portfolio';
import type { Portfolio } from './portfolio';
import type { Run } from './use-run';

/** A run as the chart, the panel and the table read it. */
export interface Front {
  portfolios: Portfolio[];
  items: Run['items'];
  costAxis: Run['costAxis'];
  /** On capital, whatever the axis. */
  ceiling: Amount;
  knee: number | undefined;
  status: Run['certificate']['status'];
  /** Empty too when all is proven: there is no gap left to draw. */
  bound: Bound;
  /** How much of the cost axis is proven, 0 to 1. */
  provenShare: number;
  /** Stretches of cost within which the set is proven complete. */
  proven: (readonly [from: number, to: number])[];
  scale: RodScale;
  /** Candidates of the round, with those left out before the search. */
  candidates: number;
}

/** Undefined while the run has no portfolio. */
export function frontOf(run: Run): Front | undefined {
  if (run.points.length === 0) return undefined;
  const portfolios = toPortfolios(run.points, run.ceiling);
  const cheapest = portfolios[0]!.cost;
  const dearest = portfolios.at(-1)!.cost;
  const onCapital = run.costAxis === 'CAPITAL';
  const { status, bound, provenShare, provenStretches } = run.certificate;
  const scale = rodScale(cheapest, onCapital ? Math.max(dearest, Number(run.ceiling.amount)) : dearest);
  return {
    portfolios,
    items: run.items,
    costAxis: run.costAxis,
    ceiling: run.ceiling,
    knee: run.kneeIndex ?? undefined,
    status,
    bound: status === 'COMPLETE' ? [] : toBound(bound),
    provenShare,
    proven:
      status === 'COMPLETE'
        ? [[scale.start, scale.end]]
        : provenStretches.map(([from = 0, to = 0]) => [from, to] as const),
    scale,
    candidates: new Set([...run.items, ...run.leftOut].map(({ candidateId }) => candidateId)).size,
  };
}

/** "life-cycle cost" or "capital", for the middle of a sentence. */
export function costName(costAxis: Front['costAxis']): string {
  return costAxis === 'CAPITAL' ? 'capital' : 'life-cycle cost';
}
