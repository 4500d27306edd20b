import { hypervolume } from '../archive/hypervolume.js';
import { surfaceCertificate, type SurfaceCertificate } from '../three-objectives/surface-certificate.js';
import type {
  ThreeObjectivesPoint,
  ThreeObjectivesResult,
} from '../three-objectives/search-three-objectives.js';
import type { Problem } from '../problem/problem.js';
import type { FrontierPoint, ProvenSoFar, SearchResult } from '../search.js';

/** A search's outcome, format `metewand-frontier/1`. */
export interface FrontierDocument {
  readonly format: 'metewand-frontier/1';
  readonly problem?: string;
  /** `sha256:` and 64 hex digits, taken of the problem's canonicalText. */
  readonly fingerprint: string;
  readonly seed: number;
  readonly threads: number;
  readonly seconds: number;
  readonly points: readonly (FrontierPoint | ThreeObjectivesPoint)[];
  readonly certificate: Certificate;
  readonly counts: SearchResult['counts'];
  readonly notes: readonly string[];
}

/** What is proven about the points; with the status `unproven`, nothing. */
export interface Certificate
  extends ProvenSoFar, Partial<Pick<SurfaceCertificate, 'surfaceBound' | 'provenSecondCosts'>> {
  readonly status: SearchResult['status'];
  /** When a portfolio beats another, and which stands of equal ones; in sentences. */
  readonly rules: { readonly dominance: string; readonly ties: string };
  readonly hypervolume: number;
  /** The hypervolume of the bound: that of the whole front is no larger. Missing where nothing is proven. */
  readonly hypervolumeBound?: number;
  /** The corner the hypervolume is measured from: no benefit, at the ceiling or else at the dearest point. */
  readonly reference: { readonly benefit: number; readonly cost: number; readonly secondCost?: number };
  /** Present where the run ended before it was done. */
  readonly stopped?: true;
}

/** What the host knows of the run and the kernel does not. */
export interface RunFacts {
  readonly fingerprint: string;
  readonly threads: number;
  readonly seconds: number;
}

export function toFrontierDocument(
  problem: Problem,
  result: SearchResult | ThreeObjectivesResult,
  facts: RunFacts,
): FrontierDocument {
  const isSurface = 'surfaceBound' in result;
  const reference = { benefit: 0, cost: problem.ceiling ?? result.points.at(-1)?.cost ?? 0 };
  const steps = result.points.map(({ cost, benefit }) => [cost, benefit] as const);
  return {
    format: 'metewand-frontier/1',
    ...(problem.name === undefined ? {} : { problem: problem.name }),
    fingerprint: facts.fingerprint,
    seed: result.seed,
    threads: facts.threads,
    seconds: facts.seconds,
    points: result.points,
    certificate: {
      status: result.status,
      rules: isSurface ? RULES_OF_THREE : RULES_OF_TWO,
      provenStretches: result.provenStretches,
      bound: result.bound,
      hypervolume: hypervolume(steps, reference),
      ...(result.bound.length > 0 ? { hypervolumeBound: hypervolume(result.bound, reference) } : {}),
      reference,
      ...(isSurface ? surfaceCertificate(problem, result) : {}),
      ...(result.stopped ? { stopped: true as const } : {}),
    },
    counts: result.counts,
    notes: result.notes,
  };
}

const RULES_OF_TWO = {
  dominance:
    'A portfolio beats another if it is at least as good in benefit and cost and better in one of them.',
  ties: "Of portfolios with the same benefit and cost one stands for all. Where parts of the search bring different ones, it is the one whose choices come first in the order of the problem's items, nothing before something.",
};
const RULES_OF_THREE = {
  dominance:
    'A portfolio beats another if it is at least as good in benefit, cost and second cost and better in one of them.',
  ties: 'Of portfolios with the same benefit, cost and second cost one stands for all: the first that was found.',
};
