import {
  capitalRecovery,
  discountFactor,
  escalate,
  growingPresentValue,
  nominalRate,
  presentValue,
  presentValueOfYearly,
  realRate,
  sinkingFund,
  uniformPresentValue,
} from '../src/index.js';

const yearsTo = (last: number, first = 1) => Array.from({ length: last - first + 1 }, (_, i) => first + i);

function expectAllWithin(computed: readonly number[], printed: readonly number[], tolerance: number) {
  expect(computed).toHaveLength(printed.length);
  computed.forEach((value, i) => expect(Math.abs(value - printed[i])).toBeLessThanOrEqual(tolerance + 1e-12));
}

describe('discount factors against printed tables', () => {
  it('GB-DF-3.5: HM Treasury, The Green Book, Annex 6, 3.5 %, years 0–30 [from memory]', () => {
    const printed = [
      1, 0.9662, 0.9335, 0.9019, 0.8714, 0.842, 0.8135, 0.786, 0.7594, 0.7337, 0.7089, 0.6849, 0.6618, 0.6394,
      0.6178, 0.5969, 0.5767, 0.5572, 0.5384, 0.5202, 0.5026, 0.4856, 0.4692, 0.4533, 0.438, 0.4231, 0.4088,
      0.395, 0.3817, 0.3687, 0.3563,
    ];
    expectAllWithin(
      yearsTo(30, 0).map((year) => discountFactor(0.035, year)),
      printed,
      5e-5,
    );
  });

  it('OMB-7-END: US OMB Circular A-94 (1992), 7 %, end of year 1–10 [from memory]', () => {
    const printed = [0.9346, 0.8734, 0.8163, 0.7629, 0.713, 0.6663, 0.6227, 0.582, 0.5439, 0.5083];
    expectAllWithin(
      yearsTo(10).map((year) => discountFactor(0.07, year, 'END_OF_YEAR')),
      printed,
      5e-5,
    );
  });

  it('OMB-7-MID: US OMB Circular A-94 (1992), 7 %, middle of year 1–10 [from memory]', () => {
    const printed = [0.9667, 0.9035, 0.8444, 0.7891, 0.7375, 0.6893, 0.6442, 0.602, 0.5626, 0.5258];
    expectAllWithin(
      yearsTo(10).map((year) => discountFactor(0.07, year, 'MIDDLE_OF_YEAR')),
      printed,
      5e-5,
    );
  });

  it('NIST-SPV-3: NIST Handbook 135 with supplement NISTIR 85-3273, 3.0 %, years 1–30 [from memory]', () => {
    const printed = [
      0.971, 0.943, 0.915, 0.888, 0.863, 0.837, 0.813, 0.789, 0.766, 0.744, 0.722, 0.701, 0.681, 0.661, 0.642,
      0.623, 0.605, 0.587, 0.57, 0.554, 0.538, 0.522, 0.507, 0.492, 0.478, 0.464, 0.45, 0.437, 0.424, 0.412,
    ];
    expectAllWithin(
      yearsTo(30).map((year) => discountFactor(0.03, year)),
      printed,
      5e-4,
    );
  });

  it('NIST-UPV-3: NIST Handbook 135 with supplement NISTIR 85-3273, 3.0 %, years 1–30 [from memory]', () => {
    const printed = [
      0.97, 1.91, 2.83, 3.72, 4.58, 5.42, 6.23, 7.02, 7.79, 8.53, 9.25, 9.95, 10.63, 11.3, 11.94, 12.56,
      13.17, 13.75, 14.32, 14.88, 15.42, 15.94, 16.44, 16.94, 17.41, 17.88, 18.33, 18.76, 19.19, 19.6,
    ];
    expectAllWithin(
      yearsTo(30).map((years) => uniformPresentValue(0.03, years)),
      printed,
      5e-3,
    );
  });

  it('UPVSTAR-FORMULA: US GSA P-100 Table 1-1 and ASTM E917 [formula seen, number computed]', () => {
    expect(growingPresentValue(0.03, 0.02, 10)).toBeCloseTo(9.4813, 4);
    expect(growingPresentValue(0.03, 0.02, 10)).toBeCloseTo(
      presentValueOfYearly({ amount: 1, growth: 0.02 }, 0.03, 10),
      12,
    );
    expect(growingPresentValue(0.03, 0.03, 10)).toBe(10);
  });

  it('REAL-ESC: US GSA P-100 Table 1-1, E 5 %, I 3 % [formula seen, number computed]', () => {
    expect(realRate(0.05, 0.03)).toBeCloseTo(0.019417, 6);
    expect(nominalRate(realRate(0.05, 0.03), 0.03)).toBeCloseTo(0.05, 14);
  });

  it.each([
    ['GB-NPV-A', [-10, 2.5, 2.5, 2.5, 2.5], [2.42, 2.33, 2.25, 2.18], -0.82],
    ['GB-NPV-B', [-5, 1.5, 1.5, 1.5, 1.5], [1.45, 1.4, 1.35, 1.31], 0.51],
  ])('%s: HM Treasury, The Green Book, chapter 5 box, 3.5 % [from memory]', (_, flows, yearly, printed) => {
    expectAllWithin(
      flows.slice(1).map((flow, i) => flow * discountFactor(0.035, i + 1)),
      yearly,
      5e-3,
    );
    expectAllWithin([presentValue(flows, 0.035)], [printed], 5e-3);
  });
});

describe('identities', () => {
  it('sums to the uniform series, also at no interest and below zero', () => {
    for (const rate of [0.08, 0, -0.01, 1e-9]) {
      const summed = yearsTo(12).reduce((total, year) => total + discountFactor(rate, year), 0);
      expect(uniformPresentValue(rate, 12)).toBeCloseTo(summed, 10);
      expect(capitalRecovery(rate, 12) - sinkingFund(rate, 12)).toBeCloseTo(rate, 12);
    }
  });

  it('moves running payments half a year forward but never what is paid now', () => {
    const flows = [100, 10, 10];
    const later = presentValue(flows, 0.07) - 100;
    expect(presentValue(flows, 0.07, 'MIDDLE_OF_YEAR')).toBeCloseTo(100 + later * Math.sqrt(1.07), 12);
  });

  it('raises a price year by year', () => {
    expect(escalate(100, 0.02, 3)).toBeCloseTo(106.1208, 10);
  });
});

describe('refusals', () => {
  it.each([-1, -1.5, Number.NaN, Number.POSITIVE_INFINITY])('refuses the rate %p', (rate) => {
    expect(() => discountFactor(rate, 1)).toThrow('rate must be a rate above -1');
    expect(() => uniformPresentValue(rate, 1)).toThrow('rate must be a rate above -1');
  });

  it('refuses a life below one year, half years and amounts that are no numbers', () => {
    expect(() => uniformPresentValue(0.03, 0)).toThrow('years must be a whole number of at least 1, got 0.');
    expect(() => discountFactor(0.03, 1.5)).toThrow('year must be a whole number');
    expect(() => presentValue([1, Number.NaN], 0.03)).toThrow('flows[1] must be a number');
  });
});
