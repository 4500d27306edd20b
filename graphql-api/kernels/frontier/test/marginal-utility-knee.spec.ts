import { marginalUtilities, marginalUtilityKnee } from '../src/archive/marginal-utility-knee.js';
import { Random } from '../src/local-search/random.js';

describe('the knee by expected marginal utility', () => {
  it('is what can be worked out by hand for three points', () => {
    // stretched: (0, 1), (1/4, 1/4), (1, 0). The middle comes to 1/4 for every weight w of cost, the ends to 1 - w and w:
    // it is best for w in 1/4..3/4 and missed by min(w, 1 - w) - 1/4, two triangles of base and height 1/4
    const points: [number, number][] = [
      [100, 10],
      [200, 40],
      [500, 50],
    ];
    const [first, middle, last] = marginalUtilities(points);
    expect(middle).toBeCloseTo(1 / 16, 12);
    // without the first the middle takes over: 1/4 - (1 - w) for w in 3/4..1
    expect(first).toBeCloseTo(1 / 32, 12);
    expect(last).toBeCloseTo(1 / 32, 12);
    expect(marginalUtilityKnee(points)).toBe(1);
  });

  it('prefers the bend that nothing else replaces to a pair that replaces each other', () => {
    // stretched: (0, 1), (0.1, 0.5), (0.11, 0.49), (0.5, 0.1), (1, 0)
    const points: [number, number][] = [
      [0, 0],
      [100, 500],
      [110, 510],
      [500, 900],
      [1000, 1000],
    ];
    expect(marginalUtilityKnee(points)).toBe(3);
    expect(marginalUtilities(points)[1]).toBeLessThan(0.02);
  });

  it('gives nothing to a point that is best for no weight, and is undefined where that is all between the ends', () => {
    const dented: [number, number][] = [
      [0, 0],
      [50, 40],
      [100, 100],
    ];
    expect(marginalUtilities(dented)[1]).toBe(0);
    expect(marginalUtilityKnee(dented)).toBeUndefined();
    const straight: [number, number][] = [
      [0, 0],
      [50, 50],
      [100, 100],
    ];
    expect(marginalUtilityKnee(straight)).toBeUndefined();
    expect(marginalUtilityKnee([[1, 1]])).toBeUndefined();
    expect(marginalUtilityKnee([])).toBeUndefined();
  });

  it('agrees with the mean over many weights', () => {
    for (let seed = 1; seed <= 20; seed++) {
      const points = aFront(seed, 3 + 2 * seed);
      const exact = marginalUtilities(points);
      const sampled = meanOverWeights(points, 20_000);
      for (const [place, utility] of exact.entries()) expect(utility).toBeCloseTo(sampled[place], 6);
    }
  });
});

function aFront(seed: number, size: number): [number, number][] {
  const random = new Random(seed);
  let [cost, benefit] = [0, 0];
  return Array.from({ length: size }, (_, place) => {
    cost += 1 + random.below(10 + 3 * place);
    benefit += 1 + random.below(10 + 3 * (size - place));
    return [cost, benefit];
  });
}

/** The definition as it stands: for each weight, what the second best comes to more than the best. */
function meanOverWeights(points: readonly [number, number][], weights: number): number[] {
  const [[firstCost, firstBenefit], [lastCost, lastBenefit]] = [points[0], points[points.length - 1]];
  const sums = points.map(() => 0);
  for (let step = 0; step < weights; step++) {
    const w = (step + 0.5) / weights;
    const worth = points.map(
      ([cost, benefit]) =>
        (w * (cost - firstCost)) / (lastCost - firstCost) +
        ((1 - w) * (lastBenefit - benefit)) / (lastBenefit - firstBenefit),
    );
    const [best, second] = [...worth].sort((one, other) => one - other);
    sums[worth.indexOf(best)] += second - best;
  }
  return sums.map((sum) => sum / weights);
}
