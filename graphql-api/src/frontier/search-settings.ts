/** Portfolios the local search of a run looks at before it leaves the field to the proof. */
export const EVALUATIONS = 20_000_000;

/** Branches the proof of a run looks at before it ends with a bound: some ten minutes of one core. */
export const EFFORT = 4_000_000_000;

export const DEFAULT_SEED = 1;

/** Points kept of those looked at, for the chart. */
export const LOOKED_AT_SAMPLE = 5_000;

/** How often a search says where it is, at most. */
export const REPORT_MS = 500;

/** How long the worker that holds a run may be silent before another takes it over. */
export const LEASE_SECONDS = 30;
export const HEARTBEAT_MS = 10_000;
export const SWEEP_MS = 10_000;

/** A run that loses its worker this often is the cause itself. */
export const MOST_ATTEMPTS = 5;
