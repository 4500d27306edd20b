import { join, list, objectWithKeys, optional, refuse, text, wholeNumber } from '../problem/json-shape.js';
import { ProblemError } from '../problem/problem-error.js';
import type { Picks } from '../problem/feasible.js';

/** A frontier as a file claims it: the parts of a FrontierDocument that a check needs, and the others if they are there. */
export interface ClaimedFrontier {
  readonly format: typeof FRONTIER_FORMAT;
  readonly problem?: string;
  readonly fingerprint: string;
  readonly seed?: number;
  readonly threads?: number;
  readonly seconds?: number;
  readonly points: readonly ClaimedPoint[];
  readonly certificate: ClaimedCertificate;
  readonly counts?: { readonly lookedAt?: number; readonly kept?: number; readonly sinceBeaten?: number };
  readonly notes?: readonly string[];
}

export interface ClaimedPoint {
  readonly benefit: number;
  readonly cost: number;
  readonly secondCost?: number;
  readonly picks: Picks;
}

export interface ClaimedCertificate {
  readonly status: (typeof STATUSES)[number];
  readonly rules?: { readonly dominance: string; readonly ties: string };
  readonly provenStretches?: readonly Pair[];
  readonly bound: readonly Pair[];
  readonly hypervolume?: number;
  readonly hypervolumeBound?: number;
  readonly reference?: { readonly benefit: number; readonly cost: number; readonly secondCost?: number };
  readonly stopped?: boolean;
  /** With a second cost only: [cost, benefit, secondCost], and intervals of second cost. */
  readonly surfaceBound?: readonly Triple[];
  readonly provenSecondCosts?: readonly Pair[];
}

export type Pair = readonly [number, number];
export type Triple = readonly [number, number, number];

/**
 * Reads a frontier out of parsed JSON as strictly as parseProblem reads a problem: throws a ProblemError with the path
 * of the key that is wrong. Whether what it claims is true is for verifyFrontier to say.
 */
export function parseFrontier(json: unknown): ClaimedFrontier {
  const required = ['format', 'fingerprint', 'points', 'certificate'];
  const object = objectWithKeys(json, '', required, [
    'problem',
    'seed',
    'threads',
    'seconds',
    'counts',
    'notes',
  ]);
  if (object.format !== FRONTIER_FORMAT) refuse('format', `"${FRONTIER_FORMAT}"`, object.format);
  return {
    format: FRONTIER_FORMAT,
    problem: optional(object, 'problem', '', (value, path) => text(value, path)),
    fingerprint: fingerprint(object.fingerprint, 'fingerprint'),
    seed: optional(object, 'seed', '', (value, path) => wholeNumber(value, path)),
    threads: optional(object, 'threads', '', (value, path) => wholeNumber(value, path, { least: 1 })),
    seconds: optional(object, 'seconds', '', atLeastZero),
    points: list(object.points, 'points', point),
    certificate: certificate(object.certificate, 'certificate'),
    counts: optional(object, 'counts', '', counts),
    notes: optional(object, 'notes', '', (value, path) => list(value, path, (note, at) => text(note, at))),
  };
}

const FRONTIER_FORMAT = 'metewand-frontier/1';
const STATUSES = ['complete', 'bounded', 'unproven', 'infeasible'] as const;

function fingerprint(value: unknown, path: string): string {
  if (typeof value !== 'string' || !/^sha256:[0-9a-f]{64}$/.test(value)) {
    refuse(path, '"sha256:" and 64 hex digits in small letters', value);
  }
  return value;
}

function point(value: unknown, path: string): ClaimedPoint {
  const object = objectWithKeys(value, path, ['benefit', 'cost', 'picks'], ['secondCost']);
  const secondCost = optional(object, 'secondCost', path, wholeFromZero);
  return {
    benefit: wholeFromZero(object.benefit, join(path, 'benefit')),
    cost: wholeFromZero(object.cost, join(path, 'cost')),
    ...(secondCost === undefined ? {} : { secondCost }),
    picks: picks(object.picks, join(path, 'picks')),
  };
}

function picks(value: unknown, path: string): Picks {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) refuse(path, 'an object', value);
  const pieces = Object.entries(value).map(
    ([id, count]) => [id, wholeNumber(count, join(path, id), { least: 1 })] as const,
  );
  return Object.fromEntries(pieces);
}

function certificate(value: unknown, path: string): ClaimedCertificate {
  const object = objectWithKeys(value, path, ['status', 'bound'], CERTIFICATE_KEYS);
  const status = STATUSES.find((each) => each === object.status);
  if (status === undefined) refuse(join(path, 'status'), `one of ${STATUSES.join(', ')}`, object.status);
  return {
    status,
    rules: optional(object, 'rules', path, rules),
    bound: list(object.bound, join(path, 'bound'), (pair, at) => numbers<Pair>(pair, at, 2, number)),
    provenStretches: optional(object, 'provenStretches', path, intervals),
    hypervolume: optional(object, 'hypervolume', path, atLeastZero),
    hypervolumeBound: optional(object, 'hypervolumeBound', path, atLeastZero),
    reference: optional(object, 'reference', path, reference),
    stopped: optional(object, 'stopped', path, trueOrFalse),
    surfaceBound: optional(object, 'surfaceBound', path, (triples, at) =>
      list(triples, at, (triple, tripleAt) => numbers<Triple>(triple, tripleAt, 3, number)),
    ),
    provenSecondCosts: optional(object, 'provenSecondCosts', path, intervals),
  };
}

const CERTIFICATE_KEYS = [
  'rules',
  'provenStretches',
  'hypervolume',
  'hypervolumeBound',
  'reference',
  'stopped',
  'surfaceBound',
  'provenSecondCosts',
];

function rules(value: unknown, path: string): ClaimedCertificate['rules'] {
  const object = objectWithKeys(value, path, ['dominance', 'ties'], []);
  return {
    dominance: text(object.dominance, join(path, 'dominance')),
    ties: text(object.ties, join(path, 'ties')),
  };
}

function reference(value: unknown, path: string): ClaimedCertificate['reference'] {
  const object = objectWithKeys(value, path, ['benefit', 'cost'], ['secondCost']);
  const secondCost = optional(object, 'secondCost', path, wholeFromZero);
  return {
    benefit: wholeFromZero(object.benefit, join(path, 'benefit')),
    cost: wholeFromZero(object.cost, join(path, 'cost')),
    ...(secondCost === undefined ? {} : { secondCost }),
  };
}

function counts(value: unknown, path: string): ClaimedFrontier['counts'] {
  const object = objectWithKeys(value, path, [], ['lookedAt', 'kept', 'sinceBeaten']);
  return {
    lookedAt: optional(object, 'lookedAt', path, wholeFromZero),
    kept: optional(object, 'kept', path, wholeFromZero),
    sinceBeaten: optional(object, 'sinceBeaten', path, wholeFromZero),
  };
}

function intervals(value: unknown, path: string): Pair[] {
  return list(value, path, (pair, at) => numbers<Pair>(pair, at, 2, wholeFromZero));
}

function numbers<T extends readonly number[]>(
  value: unknown,
  path: string,
  length: T['length'],
  read: (value: unknown, path: string) => number,
): T {
  const figures = list(value, path, read);
  if (figures.length === length) return figures as readonly number[] as T;
  throw new ProblemError(path, `a list of ${length} numbers`, `a list of ${figures.length}`);
}

function wholeFromZero(value: unknown, path: string): number {
  return wholeNumber(value, path, { least: 0 });
}

function atLeastZero(value: unknown, path: string): number {
  const read = number(value, path);
  if (read < 0) refuse(path, 'a number of at least 0', value);
  return read;
}

function number(value: unknown, path: string): number {
  if (typeof value !== 'number' || !Number.isFinite(value)) refuse(path, 'a number', value);
  return value;
}

function trueOrFalse(value: unknown, path: string): boolean {
  if (typeof value !== 'boolean') refuse(path, 'true or false', value);
  return value;
}
