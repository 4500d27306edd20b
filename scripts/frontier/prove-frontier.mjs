import { HighsSolver } from './highs-solver.mjs';
import { surfaceQuestions } from './surface-questions.mjs';

/**
 * Proves by another solver, HiGHS, that nothing is missing in a frontier that verifyFrontier has nothing against: for
 * each step of its bound, that no feasible portfolio cheaper than the next step has more benefit. The bound of a
 * complete frontier is its points, so this is completeness. Yields a finding for each step that fails, with the
 * portfolio that was found, or that could not be decided within `seconds`.
 */
export async function* proveFrontier(problem, claimed, { seconds, onStep = () => {} }) {
  const { status } = claimed.certificate;
  if (status === 'unproven') {
    const sentence = 'It is unproven: nothing is claimed that could be proven.';
    yield { path: 'certificate.status', sentence };
    return;
  }
  const questions = questionsOf(problem, claimed);
  const solver = new HighsSolver(problem);
  try {
    for (const [index, question] of questions.entries()) {
      const finding = await examine(solver, question, claimed, seconds);
      if (finding) yield finding;
      onStep(index + 1, questions.length);
    }
  } finally {
    solver.close();
  }
}

/** Each: `within` certain bounds of cost, no portfolio has a benefit above `most`; minus infinity: there is none. */
function questionsOf(problem, { certificate, points }) {
  const { bound, status } = certificate;
  if (status === 'infeasible') {
    return [{ path: 'certificate.status', within: {}, most: -Infinity }];
  }
  const hasSecondCost = problem.items.some(({ secondCost }) => secondCost !== undefined);
  const steps = [[-Infinity, -Infinity], ...bound].map(([, most], index) => {
    const costMost = index < bound.length ? Math.ceil(bound[index][0]) - 1 : (problem.ceiling ?? Infinity);
    return {
      path: `certificate.bound[${Math.max(0, index - 1)}]`,
      within: { costMost },
      most: Math.floor(most),
    };
  });
  const surface = hasSecondCost && status === 'complete' ? surfaceQuestions(points) : [];
  return [...steps, ...surface].filter(({ within }) => within.costMost >= 0);
}

async function examine(solver, { path, within, most }, { points }, seconds) {
  const start = most === -Infinity ? undefined : knownWithin(points, within);
  const answer = await solver.ask({ ...within, seconds, start });
  if (answer.verdict === 'infeasible' || answer.bound <= most) return undefined;
  const allowed = most === -Infinity ? 'there should be no portfolio' : `no benefit should be above ${most}`;
  const place = `${inWords(within)} ${allowed}`;
  if (answer.picks === undefined || answer.benefit <= most) {
    return { path, sentence: `Undecided whether ${place}: ${answer.why}.` };
  }
  const { benefit, cost, picks } = answer;
  const named = Object.entries(picks).map(([id, pieces]) => (pieces === 1 ? id : `${pieces} × ${id}`));
  const portfolio = named.length === 0 ? 'the empty portfolio' : named.join(', ');
  return {
    path,
    sentence: `${place}, but one of benefit ${benefit} at cost ${cost} is feasible: ${portfolio}.`,
  };
}

/** The best known portfolio within the bounds: HiGHS need not look for it. */
function knownWithin(points, { costMost, secondCostMost = Infinity }) {
  let best;
  for (const point of points) {
    if (point.cost > costMost || (point.secondCost ?? 0) > secondCostMost) continue;
    if (best === undefined || point.benefit > best.benefit) best = point;
  }
  return best?.picks;
}

function inWords({ costMost = Infinity, secondCostMost = Infinity }) {
  const bounds = [
    ...(costMost < Infinity ? [`a cost of ${costMost}`] : []),
    ...(secondCostMost < Infinity ? [`a second cost of ${secondCostMost}`] : []),
  ];
  return bounds.length === 0 ? 'at any cost' : `up to ${bounds.join(' and ')}`;
}
