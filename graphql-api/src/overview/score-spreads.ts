import type { Candidate } from '../candidates/entities/candidate.entity.js';
import type { Membership } from '../memberships/entities/membership.entity.js';
import type { Criterion } from '../scoring/entities/criterion.entity.js';
import type { Score } from '../scoring/entities/score.entity.js';

/** How far the assessors lie apart on one criterion of one candidate. */
export interface Spread {
  candidate: Candidate;
  criterionName: string;
  points: number;
  /** Whose score lies farthest from the mean. */
  outlier: Membership | null;
}

type GivenScore = Score & { points: number };

/** One spread for each candidate and criterion that somebody scored. */
export function scoreSpreads(
  scores: readonly Score[],
  candidates: readonly Candidate[],
  criteria: readonly Criterion[],
  assessors: readonly Membership[],
): Spread[] {
  const given = scores.filter((score): score is GivenScore => score.points !== null);
  return candidates.flatMap((candidate) => {
    const own = given.filter(({ candidateId }) => candidateId === candidate.id);
    return criteria.flatMap(({ id, name }) => {
      const together = own.filter(({ criterionId }) => criterionId === id);
      return together.length > 0 ? [spreadOf(candidate, name, together, assessors)] : [];
    });
  });
}

function spreadOf(
  candidate: Candidate,
  criterionName: string,
  scores: readonly GivenScore[],
  assessors: readonly Membership[],
): Spread {
  const points = scores.map((score) => score.points);
  const mean = points.reduce((sum, each) => sum + each, 0) / points.length;
  const farthest = scores.reduce((far, score) =>
    Math.abs(score.points - mean) > Math.abs(far.points - mean) ? score : far,
  );
  return {
    candidate,
    criterionName,
    points: Math.max(...points) - Math.min(...points),
    outlier: assessors.find(({ id }) => id === farthest.membershipId) ?? null,
  };
}
