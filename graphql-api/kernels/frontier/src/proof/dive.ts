import { narrow } from '../relaxation/narrow-part.js';
import type { OpenPart } from '../relaxation/open-part.js';
import { Relaxation } from '../relaxation/relaxation.js';
import { Deviations } from './deviations.js';
import { RELAXATION } from './effort.js';
import { Enumeration } from './enumeration.js';
import type { Goal } from './goal.js';
import { lossesAt, type Losses } from './losses.js';
import type { Gap } from './step-line.js';

/**
 * Looks for good portfolios below a relaxation: settles the classes whose shares come nearest to whole, solves what is
 * left, and so on until all shares are whole, with a short enumeration around each step. Where a part has many classes
 * the branches of a proof reach a whole portfolio late; this is how it comes by some at once. It stays among the options
 * that lose least, so that its steps are quick however many there are. Returns the effort.
 */
export function dive(
  part: OpenPart,
  { relaxation, losses: { loss } }: { readonly relaxation: Relaxation; readonly losses: Losses },
  gap: Gap,
  goal: Goal,
): number {
  let effort = 0;
  const core = narrow(part, leastLosing(loss, part.classCount), { ...part, from: gap.from, to: gap.to });
  if (!core) return effort;
  let here = { part: core, relaxation: new Relaxation(core, relaxation.known()) };
  if (!here.relaxation.minimise(middleOf(core)) && !here.relaxation.minimise(core.to)) return effort;
  for (let depth = 0; depth < MOST_DEPTH; depth++) {
    const keep = settleHalf(here.part, here.relaxation.shares);
    const next = keep && narrow(here.part, keep, { ...here.part, from: gap.from, to: gap.to });
    if (!next) return effort;
    const solved = new Relaxation(next, here.relaxation.known());
    effort += RELAXATION;
    if (!solved.minimise(middleOf(next)) && !solved.minimise(next.to)) return effort;
    here = { part: next, relaxation: solved };
    const losses = lossesAt(next, solved.prices);
    const left = goal.gapBelow(losses.tangent, next);
    if (!left) return effort;
    const deviations = new Deviations(next, losses, left.gap);
    const enumeration = new Enumeration({ deviations, prices: solved.prices.slice(), stretch: left, goal });
    const isThrough = enumeration.run(left.gap / 2, BRANCHES);
    effort += enumeration.branches;
    if (isThrough && depth > 0) return effort;
  }
  return effort;
}

/** Marks the best option of each class and, of the others, those that lose least, as many as make a core. */
function leastLosing(loss: Float64Array, classCount: number): Uint8Array {
  const cap = loss.length > classCount + CORE ? Float64Array.from(loss).sort()[classCount + CORE] : Infinity;
  return Uint8Array.from(loss, (each) => (each <= cap ? 1 : 0));
}

function middleOf({ from, to }: OpenPart): number {
  return Math.floor((from + to) / 2);
}

/**
 * Marks what to keep when each class with shares is settled at its largest, for the better half of them. Undefined if
 * no class is chosen in shares.
 */
function settleHalf(part: OpenPart, shares: Float64Array): Uint8Array | undefined {
  const broken: { readonly k: number; readonly option: number }[] = [];
  for (let k = 0; k < part.classCount; k++) {
    let largest = part.start[k];
    for (let option = largest; option < part.start[k + 1]; option++) {
      if (shares[option] > shares[largest]) largest = option;
    }
    if (shares[largest] < 1 - WHOLE) broken.push({ k, option: largest });
  }
  if (broken.length === 0) return undefined;
  broken.sort((one, other) => shares[other.option] - shares[one.option] || one.k - other.k);
  const keep = new Uint8Array(part.option.length).fill(1);
  for (const { k, option } of broken.slice(0, Math.ceil(broken.length / 2))) {
    keep.fill(0, part.start[k], part.start[k + 1]);
    keep[option] = 1;
  }
  return keep;
}

const CORE = 100;
const MOST_DEPTH = 40;
const BRANCHES = 2_000;
const WHOLE = 1e-6;
