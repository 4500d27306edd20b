import { minorDigits } from '@metewand/money';
import { toMoneyModel } from '../common/models/money.model.js';
import { formatPoints } from '../scoring/points.js';
import { CostAxis } from './cost-axis.enum.js';
import {
  CertificateStatus,
  type ChartPoints,
  type RunCertificate,
  type RunItem,
  type RunPoint,
  type RunProgress,
} from './models/run-parts.model.js';
import type { ChartPair, RunInput, RunPointRow, RunProgressRow, RunResultRow } from './run-result.js';

/** From a run's rows to what the API shows. */

export function itemViews({ items, currency }: RunInput): RunItem[] {
  return items.map(({ benefit, capitalMinor, lifeCycleCostMinor, ...labels }) => ({
    ...labels,
    benefit: formatPoints(benefit),
    capital: toMoneyModel(capitalMinor, currency),
    lifeCycleCost: toMoneyModel(lifeCycleCostMinor, currency),
  }));
}

export function pointViews(points: readonly RunPointRow[], input: RunInput, costAxis: CostAxis): RunPoint[] {
  return points.map((point) => ({
    benefit: formatPoints(point.benefit),
    cost: toMoneyModel(point.cost, input.currency),
    capital: toMoneyModel(
      costAxis === CostAxis.CAPITAL ? point.cost : capitalOfPoint(point, input),
      input.currency,
    ),
    picks: point.picks,
  }));
}

function capitalOfPoint({ picks }: RunPointRow, { items }: RunInput): number {
  return picks.reduce((sum, index) => sum + items[index].capitalMinor, 0);
}

export function progressView(at: RunProgressRow | RunResultRow): RunProgress {
  const best = at.points.at(-1);
  return {
    evaluations: at.evaluations,
    kept: at.points.length,
    lookedAt: at.evaluations,
    bestBenefit: best ? formatPoints(best.benefit) : null,
    share: at.of > 0 ? Math.min(1, at.evaluations / at.of) : 1,
  };
}

export function chartView(pairs: readonly ChartPair[], currency: string): ChartPoints {
  const unit = 10 ** minorDigits(currency);
  return {
    costs: pairs.map(([cost]) => cost / unit),
    benefits: pairs.map(([, benefit]) => benefit / 10_000),
  };
}

/** The search is a heuristic: it proves nothing but that there is no portfolio at all. */
export function certificateView(result: RunResultRow | null): RunCertificate {
  return {
    status: result?.status === 'INFEASIBLE' ? CertificateStatus.INFEASIBLE : CertificateStatus.UNPROVEN,
    provenStretches: [],
    bound: { costs: [], benefits: [] },
    gapPercent: null,
  };
}
