import { hasSecondCost, type Problem } from '../problem/problem.js';
import type { ClaimedFrontier } from './parse-frontier.js';
import { certificateFindings } from './verify-certificate.js';
import { pointFindings } from './verify-points.js';
import { surfaceFindings } from './verify-surface.js';

/** Something in a frontier that is not so: where, as `points[3].cost`, and what, as a sentence. */
export interface Finding {
  readonly path: string;
  readonly sentence: string;
}

/**
 * Checks from the file alone what a frontier claims: that it is of this problem, every portfolio feasible, its sums
 * right, no point beaten by another, the bound above every point, and the certificate at one with itself. Uses nothing
 * of the search. No finding means that all of this is so; that no point is missing takes another proof.
 *
 * @param fingerprint of the problem; hashing is the host's part
 */
export function verifyFrontier(problem: Problem, claimed: ClaimedFrontier, fingerprint: string): Finding[] {
  const isSurface = hasSecondCost(problem);
  return [
    ...originFindings(problem, claimed, fingerprint),
    ...pointFindings(problem, claimed.points, isSurface),
    ...certificateFindings(problem, claimed, isSurface),
    ...surfaceFindings(claimed, isSurface),
  ];
}

function* originFindings(
  problem: Problem,
  claimed: ClaimedFrontier,
  fingerprint: string,
): Generator<Finding> {
  if (claimed.fingerprint !== fingerprint) {
    yield {
      path: 'fingerprint',
      sentence: `This is the frontier of another problem: the fingerprint of this one is ${fingerprint}.`,
    };
  }
  if (claimed.problem !== undefined && claimed.problem !== problem.name) {
    const name = problem.name === undefined ? 'has no name' : `is called "${problem.name}"`;
    yield { path: 'problem', sentence: `It says "${claimed.problem}", but the problem ${name}.` };
  }
  const kept = claimed.counts?.kept;
  if (kept !== undefined && kept !== claimed.points.length) {
    yield { path: 'counts.kept', sentence: `It is ${kept}, but there are ${claimed.points.length} points.` };
  }
}
