import { benefit } from './benefit.js';
import type { CombinedRating } from './combine-assessors.js';
import { combineAssessors } from './combine-assessors.js';
import { ScoringError } from './scoring-error.js';
import { normaliseWeights } from './weights.js';

export interface WeightedCriterion {
  readonly id: string;
  /** Raw swing weight, a whole number; the sum over the criteria does not matter. */
  readonly swingWeight: number;
}

export interface AssessorScore {
  readonly criterionId: string;
  readonly assessorId: string;
  /** Null when the assessor could not judge. */
  readonly points: number | null;
}

export interface CriterionBenefit extends CombinedRating {
  readonly criterionId: string;
  /** Share of all weights, 0 to 1. */
  readonly weight: number;
}

export interface AssessorBenefit {
  readonly assessorId: string;
  readonly benefit: number;
}

export interface CandidateBenefit {
  /** Benefit × 10 000, rounded half up from the exact fraction: the whole number a search works with. */
  readonly benefitTenThousandths: number;
  /** 0 to 100, to four decimals. */
  readonly benefit: number;
  /** Scores asked for and not given. */
  readonly missing: number;
  /** Criteria nobody scored; each counts 0, so the benefit is then too low. */
  readonly unscoredCriteria: readonly string[];
  /** The benefit as each assessor alone sees it, criteria left open filled with the others' mean. */
  readonly byAssessor: readonly AssessorBenefit[];
  /** Null when nobody scored. */
  readonly lowest: number | null;
  readonly highest: number | null;
  readonly criteria: readonly CriterionBenefit[];
}

/**
 * Weighted additive value of one candidate from the mean of its assessors. Every listed assessor is expected to score
 * every criterion; a score by somebody else counts too, since no rating is ever left out silently.
 */
export function candidateBenefit(
  criteria: readonly WeightedCriterion[],
  assessorIds: readonly string[],
  scores: readonly AssessorScore[],
): CandidateBenefit {
  checkInput(criteria, scores);
  const weights = normaliseWeights(criteria.map(({ swingWeight }) => swingWeight));
  const combined = criteria.map(({ id }, i) => ({
    criterionId: id,
    weight: weights[i],
    ...combineAssessors(ratingsOn(id, assessorIds, scores), 'mean'),
  }));
  const benefitTenThousandths = exactBenefit(criteria, combined);
  const byAssessor = assessorBenefits(combined, scores);
  const benefits = byAssessor.map((assessor) => assessor.benefit);
  return {
    benefitTenThousandths,
    benefit: benefitTenThousandths / 10_000,
    missing: combined.reduce((total, { missing }) => total + missing, 0),
    unscoredCriteria: combined.filter(({ counted }) => counted === 0).map(({ criterionId }) => criterionId),
    byAssessor,
    lowest: benefits.length ? Math.min(...benefits) : null,
    highest: benefits.length ? Math.max(...benefits) : null,
    criteria: combined,
  };
}

function ratingsOn(
  criterionId: string,
  assessorIds: readonly string[],
  scores: readonly AssessorScore[],
): (number | null)[] {
  const given = new Map(
    scores
      .filter((score) => score.criterionId === criterionId)
      .map((score) => [score.assessorId, score.points]),
  );
  return [...new Set([...assessorIds, ...given.keys()])].map((assessorId) => given.get(assessorId) ?? null);
}

/** Σ raw·(sum/counted) / Σ raw as one fraction, rounded once; floating point could tip a half the wrong way. */
function exactBenefit(criteria: readonly WeightedCriterion[], combined: readonly CombinedRating[]): number {
  let numerator = 0n;
  let denominator = 1n;
  combined.forEach(({ sum, counted }, i) => {
    if (counted === 0) return;
    const weighted = BigInt(criteria[i].swingWeight) * BigInt(sum);
    numerator = numerator * BigInt(counted) + weighted * denominator;
    denominator *= BigInt(counted);
  });
  denominator *= criteria.reduce((total, { swingWeight }) => total + BigInt(swingWeight), 0n);
  return Number((numerator * 20_000n + denominator) / (2n * denominator));
}

function assessorBenefits(
  combined: readonly CriterionBenefit[],
  scores: readonly AssessorScore[],
): AssessorBenefit[] {
  const assessorIds = new Set(
    scores.filter(({ points }) => points !== null).map(({ assessorId }) => assessorId),
  );
  return [...assessorIds].map((assessorId) => {
    const own = new Map(
      scores
        .filter((score) => score.assessorId === assessorId)
        .map((score) => [score.criterionId, score.points]),
    );
    const values = combined.map(({ criterionId, mean }) => own.get(criterionId) ?? mean ?? 0);
    return {
      assessorId,
      benefit: benefit(
        combined.map(({ weight }) => weight),
        values,
      ),
    };
  });
}

function checkInput(criteria: readonly WeightedCriterion[], scores: readonly AssessorScore[]): void {
  const ids = new Set(criteria.map(({ id }) => id));
  if (ids.size !== criteria.length) throw new ScoringError('The same criterion is listed twice.');
  const fraction = criteria.find(({ swingWeight }) => !Number.isSafeInteger(swingWeight));
  if (fraction)
    throw new ScoringError(
      `The weight of ${fraction.id} must be a whole number, got ${fraction.swingWeight}.`,
    );
  const seen = new Set<string>();
  for (const { criterionId, assessorId } of scores) {
    if (!ids.has(criterionId))
      throw new ScoringError(`There is a score on ${criterionId}, which is no criterion here.`);
    const key = JSON.stringify([criterionId, assessorId]);
    if (seen.has(key)) throw new ScoringError(`${assessorId} has two scores on ${criterionId}.`);
    seen.add(key);
  }
}
