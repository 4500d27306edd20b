import { Random } from '../src/local-search/random.js';
import { compileModel } from '../src/model/compile-model.js';
import { ProvenFront } from '../src/proof/proven-front.js';
import { aProblem } from './examples.js';
import { everyChoice, frontOf } from './every-choice.js';

describe('a front that is proven', () => {
  // all items alike: of every point there are many portfolios
  const model = compileModel(aProblem(['bed', 'lamp', 'scope', 'pump', 'hoist', 'scale']))!;
  const portfolios = everyChoice(model);

  it('keeps the same portfolios in whatever order they come, also from another front', () => {
    const random = new Random(1);
    const fronts = Array.from({ length: 20 }, () => {
      const own = new ProvenFront(model);
      const other = new ProvenFront(model);
      for (const { benefit, cost, chosen } of [...portfolios].sort(() => random.fraction() - 0.5)) {
        (random.fraction() < 0.5 ? own : other).offer(benefit, cost, chosen);
      }
      own.offerAll(other.front);
      return own.front.points().map((point, place) => [point, [...own.front.choicesAt(place)]]);
    });
    for (const front of fronts) expect(front).toEqual(fronts[0]);
    expect(fronts[0].map(([point]) => point)).toEqual(frontOf(portfolios));
  });

  it('keeps the choices that come first', () => {
    const front = new ProvenFront(model);
    for (const { benefit, cost, chosen } of portfolios) front.offer(benefit, cost, chosen);
    const equals = portfolios.filter(({ cost }) => cost === 30).map(({ chosen }) => [...chosen]);
    equals.sort((one, other) => {
      const k = one.findIndex((option, place) => option !== other[place]);
      return one[k] - other[k];
    });
    expect(equals.length).toBe(20);
    expect([...front.front.choicesAt(front.front.placeWithin(30))]).toEqual(equals[0]);
  });
});
