/** Portfolios the local search of a run looks at before it leaves the field to the proof. */
export const EVALUATIONS = 20_000_000;

/** Branches the proof of a run looks at before it ends with a bound: some ten minutes of one core. */
export const EFFORT = 4_000_000_000;

export const DEFAULT_SEED = 1;

/** Points kept of those looked at, for the chart. */
export const LOOKED_AT_SAMPLE = 5_000;

/** Branches looked at for the alternatives of a point: some hundredths of a second, so that the API can answer by itself. */
export const ALTERNATIVES_EFFORT = 50_000;

/** How often a search says where it is, at most. */
export const REPORT_MS = 500;

/** How long the worker that holds a run may be silent before another takes it over. */
export const LEASE_SECONDS = 30;
/** As often it hears whether somebody wants the run to stop. */
export const HEARTBEAT_MS = 2_000;
export const SWEEP_MS = 10_000;

/** The same for a task of a run that several workers share. */
export const TASK_LEASE_SECONDS = 15;
export const TASK_HEARTBEAT_MS = 4_000;

/** For injection: how many threads of this process work on a run. */
export const SEARCH_THREADS = Symbol('SEARCH_THREADS');

/** A run that loses its worker this often is the cause itself. */
export const MOST_ATTEMPTS = 5;
