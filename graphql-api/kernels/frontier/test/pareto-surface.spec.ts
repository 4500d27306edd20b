import { Random } from '../src/local-search/random.js';
import { ParetoSurface } from '../src/three-objectives/pareto-surface.js';

type Figures = [benefit: number, cost: number, secondCost: number];

/** One class of a million options, so that a member's choice can tell which offer it was. */
const OPTION_START = Int32Array.of(0, 1_000_000);

describe('a surface of portfolios that do not beat each other in three figures', () => {
  it('takes in what no member matches or beats and drops what it beats', () => {
    const beaten: number[][] = [];
    const surface = new ParetoSurface(OPTION_START, (benefit, cost) => beaten.push([benefit, cost]));
    const offer = (...figures: Figures): number => surface.offer(...figures, Int32Array.of(0));
    expect(offer(10, 10, 10)).toBeGreaterThanOrEqual(0);
    expect(offer(10, 10, 10)).toBe(-1);
    expect(offer(10, 10, 11)).toBe(-1);
    expect(offer(10, 10, 9)).toBeGreaterThanOrEqual(0);
    expect(offer(9, 9, 20)).toBeGreaterThanOrEqual(0);
    expect(offer(9, 20, 8)).toBeGreaterThanOrEqual(0);
    expect(figuresOf(surface)).toEqual([
      [9, 9, 20],
      [10, 10, 9],
      [9, 20, 8],
    ]);
    expect(offer(11, 9, 8)).toBeGreaterThanOrEqual(0);
    expect(figuresOf(surface)).toEqual([[11, 9, 8]]);
    expect(beaten).toHaveLength(4);
    expect(surface.sinceBeaten).toBe(4);
  });

  it('answers for itself without being offered anything', () => {
    const surface = new ParetoSurface(OPTION_START);
    expect(surface.isBeaten(1, 0, 0)).toBe(false);
    expect(surface.leastSecondCost(0, 100)).toBe(Infinity);
    expect(surface.mostBenefit).toBeUndefined();
    surface.offer(5, 6, 7, Int32Array.of(0));
    surface.offer(5, 3, 9, Int32Array.of(0));
    expect(surface.isBeaten(5, 6, 7)).toBe(true);
    expect(surface.isBeaten(5, 6, 6)).toBe(false);
    expect(surface.wouldBeat(5, 6, 7)).toBe(true);
    expect(surface.wouldBeat(6, 7, 6)).toBe(false);
    expect([2, 3, 6].map((cost) => surface.leastSecondCost(5, cost))).toEqual([Infinity, 9, 7]);
    expect(surface.spread()).toEqual({ benefit: 0, cost: 3, secondCost: 2 });
  });

  it.each([
    ['with hardly any ties', 5_000, (random: Random) => random.below(5_000)],
    ['with many ties', 12, (random: Random) => random.below(12)],
    ['with many ties in a wider range', 60, (random: Random) => random.below(60)],
  ])('is the unbeaten part of all it was ever offered, %s', (_, range, figure) => {
    for (let seed = 1; seed <= 2; seed++) {
      const random = new Random(seed);
      compareWithFilter(3_000, () => [figure(random), figure(random), figure(random)]);
      // a band along a plane, so that most are members, and one in order of cost, so that branches grow one-sided
      compareWithFilter(1_200, () => aboutAPlane(figure(random), figure(random), range, random.below(3)));
      compareWithFilter(1_200, (offer) => aboutAPlane(offer, figure(random), range, random.below(3)));
      // three figures in four the same
      compareWithFilter(1_200, () =>
        aboutAPlane(random.below(4) ? 5 : figure(random), figure(random), range, 0),
      );
    }
  });

  it('keeps every of many members that come in order, and finds each of them', () => {
    const surface = new ParetoSurface(OPTION_START);
    const count = 10_000;
    for (let number = 0; number < count; number++) {
      surface.offer(2 * number, 2 * number, 2 * ((number * 7) % 1_000), Int32Array.of(number));
    }
    expect(surface.size).toBe(count);
    const astray = surface.slots().filter((slot) => {
      const [benefit, cost] = [surface.benefitOf(slot), surface.costOf(slot)];
      const secondCost = surface.secondCostOf(slot);
      return (
        surface.choicesOf(slot)[0] !== benefit / 2 ||
        !surface.isBeaten(benefit, cost, secondCost) ||
        surface.isBeaten(benefit, cost, secondCost - 1) ||
        surface.isBeaten(benefit, cost - 1, secondCost)
      );
    });
    expect(astray).toHaveLength(0);
  });
});

function aboutAPlane(cost: number, secondCost: number, range: number, extra: number): Figures {
  return [cost + secondCost + extra - range, cost, secondCost];
}

/** Against a list that is filtered anew at every offer. */
function compareWithFilter(offers: number, draw: (offer: number) => Figures): void {
  const surface = new ParetoSurface(OPTION_START);
  let filtered: { figures: Figures; offer: number }[] = [];
  for (let offer = 0; offer < offers; offer++) {
    const figures = draw(offer);
    const [benefit, cost, secondCost] = figures;
    const isBeaten = filtered.some(({ figures: [b, c, s] }) => b >= benefit && c <= cost && s <= secondCost);
    const slot = surface.offer(...figures, Int32Array.of(offer));
    if (slot >= 0 === isBeaten) throw new Error(`Offer ${offer}, ${figures.join(' ')}, was judged wrongly.`);
    if (isBeaten) continue;
    filtered = filtered.filter(({ figures: [b, c, s] }) => !(b <= benefit && c >= cost && s >= secondCost));
    filtered.push({ figures, offer });
  }
  const members = Array.from(surface.slots(), (slot) => ({
    figures: [surface.benefitOf(slot), surface.costOf(slot), surface.secondCostOf(slot)],
    offer: surface.choicesOf(slot)[0],
  }));
  filtered.sort(({ figures: one }, { figures: other }) => one[1] - other[1] || one[2] - other[2]);
  expect(members).toEqual(filtered);
}

function figuresOf(surface: ParetoSurface): Figures[] {
  return Array.from(surface.slots(), (slot) => [
    surface.benefitOf(slot),
    surface.costOf(slot),
    surface.secondCostOf(slot),
  ]);
}
