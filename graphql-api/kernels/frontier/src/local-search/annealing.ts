import { budgetOf } from './construct.js';
import type { Random } from './random.js';
import type { SearchArchive } from '../archive/search-archive.js';
import type { Links } from '../model/links.js';
import type { WorkingPortfolio } from '../model/working-portfolio.js';

/**
 * Simulated annealing (Kirkpatrick, Gelatt, Vecchi 1983; from memory) from a member of the front on, at a price for
 * cost: random single changes, of which worse ones are taken too, ever more rarely as it cools down geometrically.
 * Broken rules are allowed at a penalty, so that the walk gets through where every single change would break one.
 * What it meets is offered; where it ends may have to be repaired.
 */
export class Annealing {
  private readonly replaced: Int32Array;

  constructor(
    private readonly portfolio: WorkingPortfolio,
    private readonly links: Links,
    private readonly archive: SearchArchive,
    private readonly random: Random,
  ) {
    this.replaced = new Int32Array(portfolio.chosen.length);
  }

  /** Walks on from the portfolio as it stands. */
  walk(price: number): void {
    const { portfolio } = this;
    const { optionClass, classCount } = portfolio.model;
    const options = optionClass.length;
    if (options === classCount) return;
    const penalty = price * budgetOf(portfolio.model);
    const steps = STEPS_PER_OPTION * options;
    const cooling = COOLED_TO ** (1 / steps);
    let temperature = HEAT * this.typicalChange(price);
    for (let step = 0; step < steps; step++) {
      this.tryChange(this.random.below(options), price, penalty, temperature);
      temperature *= cooling;
    }
    this.archive.evaluations += steps;
  }

  private tryChange(option: number, price: number, penalty: number, temperature: number): void {
    const { portfolio, archive, links } = this;
    const { optionClass, optionBenefit, optionCost } = portfolio.model;
    const before = portfolio.chosen[optionClass[option]];
    if (option === before) return;
    if (links.asksForMore(portfolio, option)) return this.tryPackage(option, price, penalty, temperature);
    const benefitChange = optionBenefit[option] - optionBenefit[before];
    const costChange = optionCost[option] - optionCost[before];
    const excess = portfolio.excessWith(option);
    const gain = benefitChange - price * costChange - penalty * (excess - portfolio.excess());
    if (!this.isTaken(gain, temperature)) return;
    portfolio.choose(option);
    if (excess === 0 && !archive.isBeaten(portfolio.benefit, portfolio.cost)) archive.offer(portfolio);
  }

  private tryPackage(option: number, price: number, penalty: number, temperature: number): void {
    const { portfolio, archive, links, replaced } = this;
    const size = links.packageOf(portfolio, option, this.random.below(links.variants(option)));
    const { benefit, cost } = portfolio;
    const excess = portfolio.excess();
    for (let at = 0; at < size; at++) {
      replaced[at] = portfolio.chosen[portfolio.model.optionClass[links.together[at]]];
      portfolio.choose(links.together[at]);
    }
    const worth = portfolio.benefit - benefit - price * (portfolio.cost - cost);
    if (!this.isTaken(worth - penalty * (portfolio.excess() - excess), temperature)) {
      for (let at = 0; at < size; at++) portfolio.choose(replaced[at]);
    } else if (portfolio.isFeasible() && !archive.isBeaten(portfolio.benefit, portfolio.cost)) {
      archive.offer(portfolio);
    }
  }

  private isTaken(gain: number, temperature: number): boolean {
    return gain >= 0 || this.random.fraction() < Math.exp(gain / temperature);
  }

  /** By how much a single change makes a portfolio better or worse at the price, on average. */
  private typicalChange(price: number): number {
    const { optionClass, optionBenefit, optionCost } = this.portfolio.model;
    const { chosen } = this.portfolio;
    let sum = 0;
    for (let option = 0; option < optionClass.length; option++) {
      const before = chosen[optionClass[option]];
      sum += Math.abs(
        optionBenefit[option] - optionBenefit[before] - price * (optionCost[option] - optionCost[before]),
      );
    }
    return sum / (optionClass.length - this.portfolio.model.classCount);
  }
}

const STEPS_PER_OPTION = 30;
/** The first temperature, in typical changes; the last one by the first. */
const HEAT = 0.3;
const COOLED_TO = 0.01;
