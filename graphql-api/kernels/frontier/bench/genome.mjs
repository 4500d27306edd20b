import { BENEFIT, COST, layOut } from './genome-layout.mjs';

/**
 * One portfolio as genes, put right where it breaks a rule: what is over a limit is mended by dropping, what is short
 * by taking, in an order drawn at random.
 */
export class Genome {
  constructor(problem, random) {
    this.layout = layOut(problem);
    this.random = random;
    this.order = this.layout.taking.slice();
    this.length = this.layout.genes.length;
    this.genes = new Int32Array(this.length);
    this.sums = new Float64Array(this.layout.most.length);
    this.taken = new Uint8Array(problem.items.length);
  }

  get benefit() {
    return this.sums[BENEFIT];
  }

  get cost() {
    return this.sums[COST];
  }

  /** One of the gene's options, each as likely. */
  anyOption(gene) {
    const options = this.layout.genes[gene];
    return options[this.random.below(options.length)];
  }

  /** Mends the genes in place, as far as a few rounds get; answers how much stays broken, 0 where nothing does. */
  settle(genes) {
    this.#load(genes);
    let broken = this.#violation();
    for (let round = 0; round < MOST_ROUNDS && broken > 0; round++) {
      shuffle(this.order, this.random);
      this.#mendLinks();
      this.#trim();
      this.#fill();
      broken = this.#violation();
    }
    genes.set(this.genes);
    return broken;
  }

  #load(genes) {
    this.sums.fill(0);
    this.taken.fill(0);
    this.genes.set(genes);
    for (let gene = 0; gene < genes.length; gene++) this.#add(genes[gene], 1);
  }

  #choose(option) {
    const gene = this.layout.geneOf[option];
    this.#add(this.genes[gene], -1);
    this.genes[gene] = option;
    this.#add(option, 1);
  }

  #add(option, sign) {
    const item = this.layout.itemOf[option];
    if (item < 0) return;
    this.taken[item] = sign > 0 ? 1 : 0;
    const { rows, values } = this.layout.terms[option];
    for (let at = 0; at < rows.length; at++) this.sums[rows[at]] += sign * values[at];
  }

  /** Leaves the gene's item away, unless one must be taken. */
  #drop(gene) {
    const [nothing] = this.layout.genes[gene];
    if (this.layout.itemOf[nothing] < 0) this.#choose(nothing);
  }

  #dropItem(item) {
    this.#drop(this.layout.geneOf[this.layout.firstOption[item]]);
  }

  /** Takes a partner or drops what lacks one, by the toss of a coin; of what excludes each other one stays. */
  #mendLinks() {
    const { links, firstOption, geneOf, itemOf } = this.layout;
    for (const exclusive of links.eitherOr) {
      for (const item of exclusive) {
        if (this.taken[item] === 1 && this.#countTaken(exclusive) > 1) this.#dropItem(item);
      }
    }
    for (const { item, anyOf } of links.needs) {
      if (!this.#lacks(item, anyOf)) continue;
      const partner = firstOption[anyOf[this.random.below(anyOf.length)]];
      const isFree = partner >= 0 && itemOf[this.genes[geneOf[partner]]] < 0;
      if (isFree && this.random.below(2) === 0) this.#choose(partner);
      else this.#dropItem(item);
    }
  }

  /** Drops in the drawn order what uses something, as long as that is exceeded. */
  #trim() {
    if (!this.#anyRow(OVER)) return;
    const { geneOf } = this.layout;
    for (const option of this.order) {
      if (this.genes[geneOf[option]] === option && this.#addsTo(option, OVER)) this.#drop(geneOf[option]);
    }
  }

  /** Takes in the drawn order what adds to something, as long as that falls short. */
  #fill() {
    if (!this.#anyRow(SHORT)) return;
    const { geneOf, itemOf } = this.layout;
    for (const option of this.order) {
      if (itemOf[this.genes[geneOf[option]]] < 0 && this.#addsTo(option, SHORT)) this.#choose(option);
    }
  }

  #anyRow(state) {
    for (let row = 0; row < this.sums.length; row++) if (this.#isIn(row, state)) return true;
    return false;
  }

  #addsTo(option, state) {
    const { rows, values } = this.layout.terms[option];
    for (let at = 0; at < rows.length; at++) if (values[at] > 0 && this.#isIn(rows[at], state)) return true;
    return false;
  }

  #isIn(row, state) {
    const { least, most } = this.layout;
    return state === OVER ? this.sums[row] > most[row] : this.sums[row] < least[row];
  }

  /** Excess over every row as a share of its bound, and one for every broken link. */
  #violation() {
    const { least, most, links } = this.layout;
    let broken = 0;
    for (let row = 0; row < this.sums.length; row++) {
      const over = this.sums[row] - most[row];
      const short = least[row] - this.sums[row];
      if (over > 0) broken += over / Math.max(1, Math.abs(most[row]));
      if (short > 0) broken += short / Math.max(1, Math.abs(least[row]));
    }
    for (const { item, anyOf } of links.needs) if (this.#lacks(item, anyOf)) broken++;
    for (const exclusive of links.eitherOr) broken += Math.max(0, this.#countTaken(exclusive) - 1);
    return broken;
  }

  #lacks(item, anyOf) {
    return this.taken[item] === 1 && this.#countTaken(anyOf) === 0;
  }

  #countTaken(items) {
    let count = 0;
    for (let at = 0; at < items.length; at++) count += this.taken[items[at]];
    return count;
  }
}

function shuffle(order, random) {
  for (let last = order.length - 1; last > 0; last--) {
    const place = random.below(last + 1);
    [order[last], order[place]] = [order[place], order[last]];
  }
}

const OVER = 1;
const SHORT = 2;
const MOST_ROUNDS = 4;
