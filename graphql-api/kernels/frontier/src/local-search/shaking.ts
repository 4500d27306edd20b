import type { Random } from './random.js';
import type { Links } from '../model/links.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/** Changes a portfolio at random in several places, more of them each time until that finds something new. */
export class Shaking {
  private size = LEAST_SHAKE;

  constructor(
    private readonly portfolio: WorkingPortfolio,
    private readonly links: Links,
    private readonly random: Random,
  ) {}

  shake(): void {
    for (let change = 0; change < this.size; change++) this.changeAtRandom();
  }

  /** Told what came of the last shake, decides how hard the next one is. */
  learn(foundNew: boolean): void {
    this.size = foundNew || this.size === MOST_SHAKE ? LEAST_SHAKE : this.size + 1;
  }

  private changeAtRandom(): void {
    const { portfolio, links, random } = this;
    const { classCount, optionStart } = portfolio.model;
    if (classCount === 0) return;
    const k = random.below(classCount);
    const option = optionStart[k] + random.below(optionStart[k + 1] - optionStart[k]);
    if (option === portfolio.chosen[k]) return;
    const size = links.packageOf(portfolio, option, random.below(links.variants(option)));
    for (let at = 0; at < size; at++) portfolio.choose(links.together[at]);
  }
}

const LEAST_SHAKE = 3;
const MOST_SHAKE = 12;
