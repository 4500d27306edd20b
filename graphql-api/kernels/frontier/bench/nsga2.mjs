import { ParetoFront, Random } from '@metewand/frontier';
import { Genome } from './genome.mjs';

/**
 * A plain NSGA-II with repair (Deb, Pratap, Agarwal, Meyarivan 2002, "A fast and elitist multiobjective genetic
 * algorithm: NSGA-II"; from memory), as something to measure the kernel against: constrained domination, crowding,
 * binary tournaments, single-point crossover of nine in ten, one gene of a portfolio mutated on average. Credited is everything feasible
 * it ever met, not only its population. Yields the front so far and the evaluations after every generation, for ever.
 */
export function* nsga2(problem, { seed, population = 100 }) {
  const random = new Random(seed);
  const genome = new Genome(problem, random);
  const front = new ParetoFront(0);
  let evaluations = 0;
  const settle = (genes) => {
    const violation = genome.settle(genes);
    const { benefit, cost } = genome;
    if (violation === 0) front.offer(benefit, cost, NO_CHOICES);
    evaluations++;
    return { genes, benefit, cost, violation, rank: 0, crowding: 0 };
  };
  const drawn = () => Int32Array.from({ length: genome.length }, (_, gene) => genome.anyOption(gene));
  let parents = fittest(
    Array.from({ length: population }, () => settle(drawn())),
    population,
  );
  for (;;) {
    yield { front, evaluations };
    const children = Array.from({ length: population }, () => {
      const genes = crossed(tournament(parents, random), tournament(parents, random), random);
      mutate(genes, genome, random);
      return settle(genes);
    });
    parents = fittest([...parents, ...children], population);
  }
}

const NO_CHOICES = new Int32Array(0);
const CROSSOVER_SHARE = 0.9;

function tournament(parents, random) {
  const one = parents[random.below(parents.length)];
  const other = parents[random.below(parents.length)];
  if (one.rank !== other.rank) return one.rank < other.rank ? one : other;
  return one.crowding >= other.crowding ? one : other;
}

function crossed(one, other, random) {
  if (random.fraction() >= CROSSOVER_SHARE) return one.genes.slice();
  const cut = random.below(one.genes.length);
  return one.genes.map((option, gene) => (gene < cut ? option : other.genes[gene]));
}

function mutate(genes, genome, random) {
  for (let gene = 0; gene < genes.length; gene++) {
    if (random.below(genes.length) === 0) genes[gene] = genome.anyOption(gene);
  }
}

/** The best ranks, and of the last that has room the least crowded; ranks and crowding are set on each. */
function fittest(members, wanted) {
  const chosen = [];
  for (const [rank, its] of ranksOf(members).entries()) {
    if (chosen.length === wanted) break;
    setCrowding(its);
    for (const member of its) member.rank = rank;
    if (chosen.length + its.length > wanted) its.sort((one, other) => other.crowding - one.crowding);
    chosen.push(...its.slice(0, wanted - chosen.length));
  }
  return chosen;
}

/** The fast non-dominated sort: those nothing beats, then those only the ones before beat, and so on. */
function ranksOf(members) {
  const beaten = members.map(() => []);
  const beatenBy = new Int32Array(members.length);
  for (let one = 0; one < members.length; one++) {
    for (let other = one + 1; other < members.length; other++) {
      const winner = compare(members[one], members[other]);
      if (winner < 0) beaten[one].push(other);
      if (winner > 0) beaten[other].push(one);
      if (winner !== 0) beatenBy[winner < 0 ? other : one]++;
    }
  }
  const ranks = [];
  let rank = [...members.keys()].filter((place) => beatenBy[place] === 0);
  while (rank.length > 0) {
    ranks.push(rank.map((place) => members[place]));
    rank = rank.flatMap((place) => beaten[place].filter((other) => --beatenBy[other] === 0));
  }
  return ranks;
}

/** Below 0 where the first beats the second, above 0 the other way round. */
function compare(one, other) {
  if (one.violation !== other.violation) return one.violation - other.violation;
  if (one.violation > 0) return 0;
  const better = one.benefit > other.benefit || one.cost < other.cost;
  const worse = one.benefit < other.benefit || one.cost > other.cost;
  if (better === worse) return 0;
  return better ? -1 : 1;
}

/** How far apart a member's neighbours in the same rank are; without end for the outermost. */
function setCrowding(members) {
  for (const member of members) member.crowding = 0;
  for (const figure of ['benefit', 'cost']) {
    const ordered = [...members].sort((one, other) => one[figure] - other[figure]);
    const span = ordered.at(-1)[figure] - ordered[0][figure];
    ordered[0].crowding = Infinity;
    ordered.at(-1).crowding = Infinity;
    if (span === 0) continue;
    for (let place = 1; place < ordered.length - 1; place++) {
      ordered[place].crowding += (ordered[place + 1][figure] - ordered[place - 1][figure]) / span;
    }
  }
}
