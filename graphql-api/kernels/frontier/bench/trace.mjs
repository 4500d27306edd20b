import { hypervolume } from '@metewand/frontier';

/** The hypervolume of a front that grows, over CPU seconds: looked at again once a twentieth more time has passed. */
export class Trace {
  /** [seconds, hypervolume], both rising. */
  entries = [];
  #next = 0;

  constructor(problem, watch) {
    this.watch = watch;
    this.reference = { benefit: 0, cost: ceilingOf(problem) };
  }

  /** `points` gives the front as [cost, benefit]; answers its hypervolume if it was looked at. */
  note(points) {
    const { seconds } = this.watch;
    if (seconds < this.#next) return undefined;
    this.#next = seconds * 1.05;
    return this.watch.aside(() => {
      const area = hypervolume(points(), this.reference);
      this.entries.push([seconds, area]);
      return area;
    });
  }
}

/** Hypervolumes are measured up to the ceiling, or else to the cost of everything. */
export function ceilingOf({ ceiling, items }) {
  return ceiling ?? items.reduce((sum, { cost, most = 1 }) => sum + cost * most, 0);
}

/** The hypervolume a trace had by then; 0 before its first entry. */
export function areaAt(entries, seconds) {
  return entries.findLast(([at]) => at <= seconds)?.[1] ?? 0;
}

/** When a trace first had so much; undefined if it never did. */
export function secondsTo(entries, area) {
  return entries.find(([, reached]) => reached >= area)?.[0];
}
