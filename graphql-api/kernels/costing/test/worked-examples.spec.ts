import {
  capitalisedCost,
  capitalRecovery,
  discountFactor,
  economicLife,
  equivalentAnnualCost,
  lifeCycleCost,
  sinkingFund,
} from '../src/index.js';

describe('life-cycle cost', () => {
  it('NEW-5-37: Newnan, Engineering Economic Analysis 9th ed., problem 5-37, 7 %, 20 years [seen]', () => {
    const bids = [
      { initial: 35_000, yearly: [{ amount: 6_000 }], residual: 20_000 },
      { initial: 40_000, yearly: [{ amount: 4_800 }] },
      { initial: 100_000, yearly: [{ amount: -1_500 }] },
    ];
    const totals = bids.map((bid) => Math.round(lifeCycleCost({ rate: 0.07, years: 20, ...bid }).total));
    expect(totals).toEqual([93_396, 90_851, 84_109]);
  });

  it('adds replacements and yearly costs that start late or rise', () => {
    const cost = lifeCycleCost({
      rate: 0.03,
      years: 10,
      initial: 1000,
      replacements: [{ year: 5, amount: 200 }],
      yearly: [
        { amount: 50, firstYear: 3 },
        { amount: 10, growth: 0.02 },
      ],
      residual: 100,
    });
    const late = [3, 4, 5, 6, 7, 8, 9, 10].reduce((sum, year) => sum + 50 * discountFactor(0.03, year), 0);
    expect(cost.replacements).toBeCloseTo(200 * discountFactor(0.03, 5), 10);
    expect(cost.yearly[0]).toBeCloseTo(late, 10);
    expect(cost.yearly[1]).toBeCloseTo(94.813, 3);
    expect(cost.total).toBeCloseTo(1000 + cost.replacements + late + cost.yearly[1] + cost.residual, 10);
    expect(cost.residual).toBeCloseTo(-100 * discountFactor(0.03, 10), 10);
  });

  it('refuses no life, a replacement after the end and a missing amount', () => {
    const input = { rate: 0.03, years: 10, initial: 1, yearly: [] };
    expect(() => lifeCycleCost({ ...input, years: 0 })).toThrow('years must be a whole number of at least 1');
    expect(() => lifeCycleCost({ ...input, initial: Number.NaN })).toThrow('initial must be a number');
    expect(() => lifeCycleCost({ ...input, replacements: [{ year: 11, amount: 1 }] })).toThrow(
      'after year 10',
    );
  });
});

describe('equivalent annual cost', () => {
  it('NEW-6-1: Newnan 9th ed., example 6-1, 1 000 over 10 years, 7 % [from memory]', () => {
    const annual = equivalentAnnualCost(1000, 0.07, 10);
    expect(Math.abs(annual - 142.4)).toBeLessThan(0.05);
    expect(annual).toBeCloseTo(142.38, 2);
  });

  it('NEW-6-2: Newnan 9th ed., example 6-2 p. 180, the same with salvage 200; printed from factor .1424 [seen]', () => {
    const annual = equivalentAnnualCost(1000, 0.07, 10) - 200 * sinkingFund(0.07, 10);
    expect(Math.abs(annual - 127.92)).toBeLessThan(0.05);
    expect(annual).toBeCloseTo(127.9, 2);
    expect((1000 - 200) * capitalRecovery(0.07, 10) + 200 * 0.07).toBeCloseTo(annual, 10);
    expect((1000 - 200) * sinkingFund(0.07, 10) + 1000 * 0.07).toBeCloseTo(annual, 10);
  });

  describe('RWJ: two machines, Ross, Westerfield, Jordan as worked in a public sheet, 10 % [seen]', () => {
    const costOf = (initial: number, amount: number, years: number) =>
      lifeCycleCost({ rate: 0.1, years, initial, yearly: [{ amount }] }).total;

    it('RWJ-PV: 117.36 and 159.89', () => {
      expect(Math.abs(costOf(100, 10, 2) - 117.36)).toBeLessThan(0.01);
      expect(Math.abs(costOf(140, 8, 3) - 159.89)).toBeLessThan(0.01);
    });

    it('RWJ-EAC: the sheet prints 67.26 for the first, which is wrong (digits swapped); 67.62 and 64.30', () => {
      const first = equivalentAnnualCost(costOf(100, 10, 2), 0.1, 2);
      expect(first).toBeCloseTo(67.62, 2);
      expect(Math.abs(first - 67.26)).toBeGreaterThan(0.3);
      expect(equivalentAnnualCost(costOf(140, 8, 3), 0.1, 3)).toBeCloseTo(64.3, 2);
    });
  });
});

describe('economic life', () => {
  const lives = Array.from({ length: 10 }, (_, i) => i + 1);
  const pump = {
    rate: 0.12,
    price: 12_000,
    yearlyCosts: lives.map((year) => 700 + 400 * (year - 1)),
    salvages: lives.map((year) => 12_000 * 0.75 ** year),
  };

  it('ECONLIFE: public worked solution, water pump, method as Newnan ch. 13, 12 % [seen]', () => {
    const life = economicLife(pump);
    expect(life.annualCosts.map(Math.round)).toEqual([
      5140, 4805, 4566, 4400, 4291, 4224, 4191, 4183, 4194, 4219,
    ]);
    expect([life.lifeYears, Math.round(life.annualCost)]).toEqual([8, 4183]);
  });

  it('refuses years without a salvage value', () => {
    expect(() => economicLife({ ...pump, salvages: [1] })).toThrow('one amount for each of the 10 years');
    expect(() => economicLife({ ...pump, yearlyCosts: [], salvages: [] })).toThrow('at least 1');
  });
});

describe('capitalised cost', () => {
  it('CC-AW: Blank and Tarquin, Engineering Economy, public slides, 5 % [seen]', () => {
    const none = { rate: 0.05, single: [], recurring: [], yearly: [] };
    const single = [
      { year: 0, amount: 150_000 },
      { year: 10, amount: 50_000 },
    ];
    const recurring = [{ amount: 15_000, everyYears: 13 }];
    const everyYear = { amount: 5_000, firstYear: 1 };
    const fromFifth = { amount: 3_000, firstYear: 5 };
    const expectNear = (value: number, printed: number) =>
      expect(Math.abs(value - printed)).toBeLessThanOrEqual(5);
    expectNear(capitalisedCost({ ...none, single }), 180_695);
    expectNear(capitalisedCost({ ...none, yearly: [fromFifth] }), 49_362);
    expectNear(capitalisedCost({ ...none, recurring, yearly: [everyYear] }), 116_940);
    const whole = capitalisedCost({ rate: 0.05, single, recurring, yearly: [everyYear, fromFifth] });
    expectNear(whole, 346_997);
    expectNear(whole * 0.05, 17_350);
  });

  it('refuses a rate of zero: the cost would have no end', () => {
    expect(() => capitalisedCost({ rate: 0, single: [], recurring: [], yearly: [] })).toThrow(
      'must be above 0',
    );
  });
});
