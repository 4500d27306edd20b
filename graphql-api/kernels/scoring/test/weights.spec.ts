import { benefit, normaliseWeights, rankOrderCentroidWeights } from '../src/index.js';

describe('weights', () => {
  it('GW3-WEIGHTS: Goodwin and Wright, Decision Analysis 3rd ed., ch. 3, swing weights, sum 310 [seen]', () => {
    const weights = normaliseWeights([100, 80, 70, 30, 20, 10]);
    expect(weights.map((weight) => Math.round(weight * 100))).toEqual([32, 26, 23, 10, 6, 3]);
    expect(weights.map((weight) => Number((weight * 100).toFixed(1)))).toEqual([
      32.3, 25.8, 22.6, 9.7, 6.5, 3.2,
    ]);
  });

  it('GW13-WEIGHTS: Goodwin and Wright 3rd ed., figure 13.4, across-criteria weights 30, 100, 50 [seen]', () => {
    expect(normaliseWeights([30, 100, 50]).map((weight) => Number(weight.toFixed(3)))).toEqual([
      0.167, 0.556, 0.278,
    ]);
  });

  it.each([
    [3, [0.6111, 0.2778, 0.1111]],
    [4, [0.5208, 0.2708, 0.1458, 0.0625]],
    [5, [0.4567, 0.2567, 0.1567, 0.09, 0.04]],
  ])('ROC: Edwards and Barron, SMARTS and SMARTER (1994), %i criteria [from memory]', (count, printed) => {
    const weights = rankOrderCentroidWeights(count);
    expect(weights).toHaveLength(count);
    weights.forEach((weight, i) => expect(Math.abs(weight - printed[i])).toBeLessThanOrEqual(6e-5));
    expect(weights.reduce((sum, weight) => sum + weight, 0)).toBeCloseTo(1, 14);
  });

  it.each([[[]], [[0, 0]], [[1, -1]], [[Number.NaN, 1]]])('refuses the raw weights %p', (raw) => {
    expect(() => normaliseWeights(raw)).toThrow('Weights must be numbers of zero or more');
  });

  it('refuses an order of no criteria', () => {
    expect(() => rankOrderCentroidWeights(0)).toThrow('at least 1');
  });
});

describe('additive value', () => {
  const printedWeights = [0.32, 0.26, 0.23, 0.1, 0.06, 0.03];

  it('GW3-ADDISON: Goodwin and Wright 3rd ed., p. 44 [seen]', () => {
    expect(benefit(printedWeights, [100, 60, 100, 75, 0, 90])).toBeCloseTo(80.8, 10);
  });

  it.each([
    ['A', [100, 60, 100, 75, 0, 90], 80.8],
    ['B', [20, 80, 10, 30, 100, 30], 39.4],
    ['C', [80, 70, 0, 0, 10, 100], 47.4],
    ['D', [70, 50, 30, 55, 30, 90], 52.3],
    ['E', [40, 60, 90, 100, 60, 70], 64.8],
    ['F', [0, 0, 70, 0, 80, 0], 20.9],
    ['G', [60, 100, 20, 50, 50, 80], 60.2],
  ])(
    'GW3-ALL: Goodwin and Wright 3rd ed., table 3.2, office %s [from memory; A, C, G seen]',
    (_, values, printed) => {
      expect(Math.abs(benefit(printedWeights, values) - printed)).toBeLessThanOrEqual(0.05);
    },
  );

  it('refuses a value without a weight', () => {
    expect(() => benefit([1], [1, 2])).toThrow('1 weights for 2 values');
  });
});
