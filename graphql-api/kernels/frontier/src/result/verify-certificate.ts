import { hypervolume } from '../archive/hypervolume.js';
import type { Problem } from '../problem/problem.js';
import type { ClaimedFrontier, Pair } from './parse-frontier.js';
import { type Staircase, staircaseOf } from './staircase.js';
import type { Finding } from './verify-frontier.js';

/** Whether the certificate is at one with the points and with itself. O(n log n) in points and steps. */
export function* certificateFindings(
  problem: Problem,
  claimed: ClaimedFrontier,
  hasSecondCost: boolean,
): Generator<Finding> {
  const { certificate, points } = claimed;
  const steps = points.map(({ cost, benefit }): Pair => [cost, benefit]);
  // points need not be in order here: what is wrong with them has been said
  const front = staircaseOf(steps);
  const bound = staircaseOf(certificate.bound);
  yield* boundFindings(claimed, bound);
  yield* stretchFindings(problem, certificate.provenStretches ?? []);
  if (!hasSecondCost) {
    yield* looseStretches(certificate.provenStretches ?? [], front, bound);
    yield* areaFindings(problem, claimed, steps);
  }
  yield* statusFindings(problem, claimed, hasSecondCost);
}

function* boundFindings({ certificate, points }: ClaimedFrontier, bound: Staircase): Generator<Finding> {
  for (const [before, [cost, benefit]] of certificate.bound.slice(1).entries()) {
    const [costBefore, benefitBefore] = certificate.bound[before];
    if (cost > costBefore && benefit > benefitBefore) continue;
    const sentence = `Steps rise in cost and in benefit; this one does not after [${costBefore}, ${benefitBefore}].`;
    yield { path: `certificate.bound[${before + 1}]`, sentence };
  }
  if (certificate.bound.length === 0) return;
  for (const [index, { cost, benefit }] of points.entries()) {
    const most = bound.at(cost);
    if (benefit <= most) continue;
    const limit = most === -Infinity ? 'which allows no portfolio' : `which is ${most}`;
    const sentence = `The benefit is ${benefit}, above the bound at its cost of ${cost}, ${limit}.`;
    yield { path: `points[${index}].benefit`, sentence };
  }
}

function* stretchFindings({ ceiling }: Problem, stretches: readonly Pair[]): Generator<Finding> {
  for (const [index, [from, to]] of stretches.entries()) {
    const path = `certificate.provenStretches[${index}]`;
    if (from > to) yield { path, sentence: `It ends at ${to}, before it begins at ${from}.` };
    if (ceiling !== undefined && to > ceiling) {
      yield { path, sentence: `It ends at ${to}, beyond the ceiling of ${ceiling}.` };
    }
    if (index > 0 && from <= stretches[index - 1][1]) {
      const sentence = `Stretches are in order and apart; this one begins at ${from}, and the one before ends at ${stretches[index - 1][1]}.`;
      yield { path, sentence };
    }
  }
}

/** Where nothing is missing, no more benefit is possible than the points have: the bound is their step line. */
function* looseStretches(stretches: readonly Pair[], front: Staircase, bound: Staircase): Generator<Finding> {
  for (const [index, [from, to]] of stretches.entries()) {
    const costs = [from, ...front.stepsWithin(from, to), ...bound.stepsWithin(from, to)];
    const loose = costs.filter((cost) => front.at(cost) !== bound.at(cost));
    if (loose.length === 0) continue;
    const cost = loose.reduce((least, each) => Math.min(least, each));
    yield {
      path: `certificate.provenStretches[${index}]`,
      sentence: `Nothing is said to be missing in it, but at a cost of ${cost} the points have ${inWords(front.at(cost))} and the bound allows ${inWords(bound.at(cost))}.`,
    };
  }
}

function inWords(benefit: number): string {
  return benefit === -Infinity ? 'no portfolio' : `a benefit of ${benefit}`;
}

function* areaFindings(
  { ceiling }: Problem,
  { certificate, points }: ClaimedFrontier,
  steps: readonly Pair[],
): Generator<Finding> {
  const { reference, bound } = certificate;
  if (reference === undefined) return;
  const cost = ceiling ?? points.at(-1)?.cost ?? 0;
  if (reference.benefit !== 0 || reference.cost !== cost) {
    const sentence = `It is benefit ${reference.benefit} at cost ${reference.cost}; areas are measured from benefit 0 at cost ${cost}, the ceiling or else the dearest point.`;
    yield { path: 'certificate.reference', sentence };
    return;
  }
  yield* wrongArea('hypervolume', certificate.hypervolume, hypervolume(steps, reference));
  yield* wrongArea('hypervolumeBound', certificate.hypervolumeBound, hypervolume(bound, reference));
}

/** Areas may pass 2^53, so they are compared to a billionth. */
function* wrongArea(key: string, claimed: number | undefined, area: number): Generator<Finding> {
  if (claimed === undefined || Math.abs(claimed - area) <= 1e-9 * area) return;
  yield { path: `certificate.${key}`, sentence: `It says ${claimed}, but the steps give ${area}.` };
}

function statusFindings(problem: Problem, claimed: ClaimedFrontier, hasSecondCost: boolean): Finding[] {
  switch (claimed.certificate.status) {
    case 'complete':
      return hasSecondCost
        ? completeAnyway(claimed)
        : [...completeAnyway(claimed), ...completeAxis(problem, claimed)];
    case 'bounded':
      return claimed.certificate.bound.length > 0
        ? []
        : [finding('bound', 'The status is bounded, and there is no bound.')];
    case 'unproven':
      return unproven(claimed);
    case 'infeasible':
      return infeasible(claimed);
  }
}

function completeAnyway({ certificate, points }: ClaimedFrontier): Finding[] {
  const findings: Finding[] = [];
  if (certificate.stopped)
    findings.push(finding('stopped', 'A complete frontier was not ended before it was done.'));
  if (points.length === 0)
    findings.push(finding('status', 'It is complete, and there is no point; it should be infeasible.'));
  return findings;
}

function completeAxis({ ceiling }: Problem, { certificate, points }: ClaimedFrontier): Finding[] {
  const findings: Finding[] = [];
  const { provenStretches: stretches = [], bound } = certificate;
  const end = ceiling ?? points.at(-1)?.cost ?? 0;
  const covers = stretches.length === 1 && stretches[0][0] === 0 && stretches[0][1] >= end;
  if (!covers) {
    const sentence = `A complete frontier has one proven stretch, over the whole axis from 0 to ${end}.`;
    findings.push(finding('provenStretches', sentence));
  }
  const length = Math.max(points.length, bound.length);
  for (let index = 0; index < length; index++) {
    const step = bound[index];
    const point = points[index];
    if (step !== undefined && point !== undefined && step[0] === point.cost && step[1] === point.benefit)
      continue;
    const stands = step === undefined ? 'there is no such step' : `step ${index} is [${step[0]}, ${step[1]}]`;
    const expected =
      point === undefined ? 'there is no such point' : `point ${index} is [${point.cost}, ${point.benefit}]`;
    findings.push(
      finding('bound', `The bound of a complete frontier is its points, but ${stands} and ${expected}.`),
    );
    break;
  }
  return findings;
}

function unproven({ certificate }: ClaimedFrontier): Finding[] {
  const findings: Finding[] = [];
  if (certificate.bound.length > 0)
    findings.push(finding('bound', 'The status is unproven, and yet there is a bound.'));
  if ((certificate.provenStretches ?? []).length > 0) {
    findings.push(finding('provenStretches', 'The status is unproven, and yet there are proven stretches.'));
  }
  return findings;
}

function infeasible({ certificate, points, notes = [] }: ClaimedFrontier): Finding[] {
  const findings: Finding[] = [];
  if (points.length > 0)
    findings.push({ path: 'points', sentence: 'The status is infeasible, and yet there are points.' });
  if (certificate.bound.length > 0)
    findings.push(finding('bound', 'The status is infeasible, and yet there is a bound.'));
  if (notes.length === 0) {
    findings.push({ path: 'notes', sentence: 'The status is infeasible, and no note names what collides.' });
  }
  return findings;
}

function finding(key: string, sentence: string): Finding {
  return { path: `certificate.${key}`, sentence };
}
