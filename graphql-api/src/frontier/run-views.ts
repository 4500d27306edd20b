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
import type {
  ChartPair,
  RunInput,
  RunPointRow,
  RunProgressRow,
  RunProofRow,
  RunResultRow,
} from './run-result.js';

/** From a run's rows to what the API shows. */

export function itemViews({ items, currency }: RunInput): RunItem[] {
  return items.map(({ benefit, capitalMinor, lifeCycleCostMinor, ...labels }) => ({
    ...labels,
    benefit: formatPoints(benefit),
    capital: toMoneyModel(capitalMinor, currency),
    lifeCycleCost: toMoneyModel(lifeCycleCostMinor, currency),
  }));
}

export function pointViews(
  at: RunProgressRow | RunResultRow | null,
  input: RunInput,
  costAxis: CostAxis,
): RunPoint[] {
  const { points = [], proof } = at ?? {};
  const boundOf = proof && boundAtRisingCosts(proof);
  return points.map((point) => ({
    benefit: formatPoints(point.benefit),
    cost: toMoneyModel(point.cost, input.currency),
    capital: toMoneyModel(
      costAxis === CostAxis.CAPITAL ? point.cost : capitalOfPoint(point, input),
      input.currency,
    ),
    picks: point.picks,
    atMostMore: boundOf ? formatPoints(boundOf(point.cost) - point.benefit) : null,
  }));
}

/** Answers the bound at a cost. The costs asked for must rise, so that all steps are passed but once. */
function boundAtRisingCosts({ bound }: RunProofRow): (cost: number) => number {
  let next = 0;
  return (cost) => {
    while (next < bound.length && bound[next][0] <= cost) next += 1;
    return bound[next - 1]?.[1] ?? 0;
  };
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
    share: provenShare(at),
  };
}

export function chartView(pairs: readonly ChartPair[], currency: string): ChartPoints {
  const unit = 10 ** minorDigits(currency);
  return {
    costs: pairs.map(([cost]) => cost / unit),
    benefits: pairs.map(([, benefit]) => benefit / 10_000),
  };
}

/** While a search goes on, what it has proven so far. */
export function certificateView(
  at: RunProgressRow | RunResultRow | null,
  { currency }: RunInput,
): RunCertificate {
  const unit = 10 ** minorDigits(currency);
  const { proof } = at ?? {};
  return {
    status: certificateStatus(at),
    provenStretches: (proof?.provenStretches ?? []).map(([from, to]) => [from / unit, to / unit]),
    bound: chartView(proof?.bound ?? [], currency),
    gapPercent: proof ? 100 * gapOf(proof) : null,
    provenShare: at ? provenShare(at) : 0,
  };
}

export function certificateStatus(at: RunProgressRow | RunResultRow | null): CertificateStatus {
  if (at && 'status' in at) return CertificateStatus[at.status];
  return at?.proof ? CertificateStatus.BOUNDED : CertificateStatus.UNPROVEN;
}

function provenShare(at: RunProgressRow | RunResultRow): number {
  if ('status' in at && at.status === 'INFEASIBLE') return 1;
  return at.proof?.provenShare ?? 0;
}

/** The share of the bound's hypervolume that the front does not reach: it may all be missing, or none of it. */
function gapOf({ hypervolume, hypervolumeBound }: RunProofRow): number {
  return hypervolumeBound > 0 ? 1 - hypervolume / hypervolumeBound : 0;
}
