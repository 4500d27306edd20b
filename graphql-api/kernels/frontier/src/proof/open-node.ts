import { narrow } from '../relaxation/narrow-part.js';
import type { OpenPart } from '../relaxation/open-part.js';
import { Relaxation, type KnownPrices } from '../relaxation/relaxation.js';
import { branchAtFirst, branchAtOption, branchAtPieces } from './branching.js';
import { Deviations } from './deviations.js';
import { dive } from './dive.js';
import { RELAXATION } from './effort.js';
import { Enumeration } from './enumeration.js';
import type { Goal } from './goal.js';
import { lossesAt, type Losses } from './losses.js';
import type { Gap, Stretch, Tangent } from './step-line.js';

/** What came of the work on a node: what is still open of it, and the effort in branches of an enumeration. */
interface Outcome {
  readonly children: OpenNode[];
  readonly effort: number;
}

/**
 * A part of the problem in a stretch of cost, with a tangent above it. Working on it closes it, or leaves parts of it
 * open: halves of the stretch where the tangent strays too far from the relaxation for its gap, else the branches of
 * an option that the relaxation chooses in shares.
 */
export class OpenNode {
  constructor(
    readonly part: OpenPart,
    readonly tangent: Tangent,
    readonly known?: KnownPrices,
    private readonly triesPieces = true,
  ) {}

  /** How far below the tangent something wanted may lie; below nought if nothing is left to find. */
  gap(goal: Goal): number {
    return goal.gapBelow(this.tangent, this.part)?.gap ?? -1;
  }

  work(goal: Goal): Outcome {
    const { part, tangent } = this;
    const open = goal.gapBelow(tangent, part);
    if (!open) return closed(0);
    const relaxation = new Relaxation(part, this.known);
    const middle = Math.floor((open.from + open.to) / 2);
    if (!relaxation.minimise(middle)) return this.dearerThan(middle, open.to, relaxation);
    const losses = lossesAt(part, relaxation.prices);
    const rest = goal.gapBelow(losses.tangent, open);
    if (!rest) return closed(RELAXATION);
    const prices = relaxation.prices.slice();
    const enumeration = this.enumerate(goal, losses, prices, rest);
    const effort = RELAXATION + enumeration.branches;
    if (enumeration.isThrough) return closed(effort);
    const left = goal.gapBelow(losses.tangent, rest);
    if (!left) return closed(effort);
    return this.split(losses, left, relaxation, effort);
  }

  /** Looks for good portfolios below the node, which stays as open as it was. Returns the effort. */
  dive(goal: Goal): number {
    const { part, tangent, known } = this;
    const open = goal.gapBelow(tangent, part);
    // where the gap is narrow there are good portfolios already
    if (!open || open.gap * part.option.length < NARROW_GAP * sum(part.benefit)) return 0;
    const relaxation = new Relaxation(part, known);
    if (!relaxation.minimise(Math.floor((open.from + open.to) / 2))) return RELAXATION;
    const losses = lossesAt(part, relaxation.prices);
    return RELAXATION + dive(part, { relaxation, losses }, open, goal);
  }

  /** What is left where the relaxation has nothing that costs no more than the middle of a stretch. */
  private dearerThan(middle: number, to: number, relaxation: Relaxation): Outcome {
    if (middle === to || !relaxation.minimise(to)) return closed(RELAXATION);
    const dearer = { from: middle + 1, to };
    const children = this.within(dearer, everything(this.part), this.tangent, relaxation.known());
    return { children, effort: 2 * RELAXATION };
  }

  private enumerate(
    goal: Goal,
    losses: Losses,
    prices: Float64Array,
    stretch: Gap,
  ): { isThrough: boolean; branches: number } {
    const deviations = new Deviations(this.part, losses, stretch.gap);
    const enumeration = new Enumeration({ deviations, prices, stretch, goal });
    // short runs first: what they find makes the gap, and with it the long run, smaller
    for (let cap = stretch.gap / 8; cap < stretch.gap; cap *= 2) {
      const left = MOST_BRANCHES - enumeration.branches;
      if (!enumeration.run(cap, left)) return { isThrough: false, branches: enumeration.branches };
    }
    const isThrough = enumeration.run(stretch.gap, MOST_BRANCHES - enumeration.branches);
    return { isThrough, branches: enumeration.branches };
  }

  private split(losses: Losses, stretch: Gap, relaxation: Relaxation, effort: number): Outcome {
    const { part } = this;
    const { tangent } = losses;
    const keep = Uint8Array.from(losses.loss, (loss) => (loss <= stretch.gap ? 1 : 0));
    const shares = relaxation.shares.slice();
    const known = relaxation.known();
    const branches = branchAtOption(part, shares, keep);
    if (stretch.to > stretch.from && (!branches || this.strays(tangent, stretch, relaxation))) {
      const children = halvesOf(stretch).flatMap((half) => this.within(half, keep, tangent, known));
      return { children, effort: effort + 2 * RELAXATION };
    }
    const byPieces = this.splitAtPieces(losses, stretch, shares, keep, known);
    if (byPieces) return { children: byPieces, effort: effort + 4 * RELAXATION };
    const children = (branches ?? branchAtFirst(part, keep)).flatMap(({ keep: kept, pieces }) => {
      const child = narrow(part, kept, { ...stretch, ...pieces });
      return child ? [new OpenNode(child, tangent, known, false)] : [];
    });
    return { children, effort: effort + 2 * RELAXATION };
  }

  /** The branches at the number of pieces, if that lowers the bound by a good part of the gap in both of them. */
  private splitAtPieces(
    { tangent }: Losses,
    stretch: Gap,
    shares: Float64Array,
    keep: Uint8Array,
    known: KnownPrices,
  ): OpenNode[] | undefined {
    const branches = this.triesPieces ? branchAtPieces(this.part, shares, keep) : undefined;
    if (!branches) return undefined;
    const middle = Math.floor((stretch.from + stretch.to) / 2);
    const children: OpenNode[] = [];
    for (const { keep: kept, pieces } of branches) {
      const part = narrow(this.part, kept, { ...stretch, ...pieces });
      if (!part) continue;
      const relaxation = new Relaxation(part, known);
      if (!relaxation.minimise(middle)) {
        if (!relaxation.minimise(stretch.to)) continue;
      } else {
        const there = lossesAt(part, relaxation.prices).tangent;
        const lowered = tangent.height - there.height + (tangent.slope - there.slope) * middle;
        if (lowered < SHARP_SHARE * stretch.gap) return undefined;
      }
      children.push(new OpenNode(part, tangent, relaxation.known()));
    }
    return children;
  }

  /** Whether at an end of the stretch the tangent lies above the relaxation by a good part of the gap. */
  private strays(tangent: Tangent, { from, to, gap }: Gap, relaxation: Relaxation): boolean {
    return [from, to].some((cost) => {
      if (!relaxation.minimise(cost)) return true;
      const there = lossesAt(this.part, relaxation.prices).tangent;
      return tangent.height + tangent.slope * cost - there.height - there.slope * cost > STRAY_SHARE * gap;
    });
  }

  private within(stretch: Stretch, keep: Uint8Array, tangent: Tangent, known: KnownPrices): OpenNode[] {
    const { leastPieces, mostPieces } = this.part;
    const part = narrow(this.part, keep.slice(), { ...stretch, leastPieces, mostPieces });
    return part ? [new OpenNode(part, tangent, known)] : [];
  }
}

function sum(figures: Float64Array): number {
  return figures.reduce((total, figure) => total + figure, 0);
}

function halvesOf({ from, to }: Stretch): Stretch[] {
  const middle = Math.floor((from + to) / 2);
  return [
    { from, to: middle },
    { from: middle + 1, to },
  ];
}

function closed(effort: number): Outcome {
  return { children: [], effort };
}

function everything({ option }: OpenPart): Uint8Array {
  return new Uint8Array(option.length).fill(1);
}

const MOST_BRANCHES = 2_000;
const STRAY_SHARE = 0.25;
/** In benefit of an average option. */
const NARROW_GAP = 0.125;
const SHARP_SHARE = 0.25;
