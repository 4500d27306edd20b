import { BestMoves } from './best-moves.js';
import type { SearchArchive } from '../archive/search-archive.js';

/**
 * Which member of the front to explore next: of those whose neighbourhood is least explored the one with the widest
 * gap to its neighbours. To look through the whole front costs about as much as one evaluation per member, so a few
 * members are lined up each time, and what has changed since is seen once as many evaluations have been made.
 */
export class ExplorationOrder {
  /** By cost, the next one last; all of one level. */
  private line: number[] = [];
  private level = 0;
  private improvementsSeen = -1;
  private evaluationsSeen = 0;

  /** @param levels a member explored to this level is done with */
  constructor(
    private readonly archive: SearchArchive,
    private readonly levels: number,
  ) {}

  /** The place of the member to explore next; -1 if all are done with. */
  next(): number {
    if (this.isWorthRenewing()) this.renew();
    for (;;) {
      const place = this.nextInLine();
      if (place >= 0) return place;
      this.renew();
      if (this.line.length === 0) return -1;
    }
  }

  /** The first in line that is still a member and not explored further; it stays in line until it is explored. */
  private nextInLine(): number {
    const { front } = this.archive;
    for (; this.line.length > 0; this.line.pop()) {
      const cost = this.line[this.line.length - 1];
      const place = front.placeWithin(cost);
      if (place < 0 || front.costAt(place) !== cost) continue;
      if (this.archive.exploredOf(front.slotAt(place)) === this.level) return place;
    }
    return -1;
  }

  private isWorthRenewing(): boolean {
    const { improvements, evaluations, front } = this.archive;
    return improvements !== this.improvementsSeen && evaluations - this.evaluationsSeen >= front.size;
  }

  private renew(): void {
    const { archive } = this;
    const { front } = archive;
    this.improvementsSeen = archive.improvements;
    this.evaluationsSeen = archive.evaluations;
    this.level = this.levels - 1;
    let widest = new BestMoves(IN_LINE, -1);
    for (let place = 0; place < front.size; place++) {
      const level = archive.exploredOf(front.slotAt(place));
      if (level > this.level) continue;
      if (level < this.level) {
        this.level = level;
        widest = new BestMoves(IN_LINE, -1);
      }
      widest.offer(place, this.gapAround(place));
    }
    this.line = widest.moves.map((place) => front.costAt(place)).reverse();
  }

  /** The most hypervolume that new members between this one's neighbours could add. */
  private gapAround(place: number): number {
    const { front } = this.archive;
    const last = front.size - 1;
    const costStep = place > 0 ? front.costAt(place) - front.costAt(place - 1) : Math.max(1, front.costAt(0));
    const benefitStep =
      place < last ? front.benefitAt(place + 1) - front.benefitAt(place) : front.benefitAt(last);
    return costStep * benefitStep;
  }
}

const IN_LINE = 16;
