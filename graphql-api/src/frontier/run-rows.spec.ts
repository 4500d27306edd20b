import { searchFrontier, type Problem } from '@metewand/frontier';
import { RunRows } from './run-rows.js';
import type { RunInput } from './run-result.js';
import { certificateView, pointViews } from './run-views.js';
import { CostAxis } from './cost-axis.enum.js';

const PROBLEM: Problem = {
  format: 'metewand-problem/1',
  ceiling: 1_200,
  items: [
    { id: 'A', benefit: 100_000, cost: 1_000 },
    { id: 'B', benefit: 50_000, cost: 300 },
    { id: 'C', benefit: 10_000, cost: 200 },
  ],
};
const INPUT = { currency: 'EUR', spendableMinor: 1_200, items: [], leftOut: [] } as unknown as RunInput;

describe('the row of a search that was proven complete', () => {
  const row = new RunRows(PROBLEM).result(outcomeOf(searchFrontier(PROBLEM)));

  it('holds what each point takes by the places of the items', () => {
    expect(row.points.map(({ cost, picks }) => [cost, picks])).toEqual([
      [0, []],
      [200, [2]],
      [300, [1]],
      [500, [1, 2]],
      [1_000, [0]],
      [1_200, [0, 2]],
    ]);
  });

  it('has no gap, and proves the axis to the ceiling', () => {
    expect(row.proof).toMatchObject({ provenShare: 1, provenStretches: [[0, 1_200]] });
    expect(certificateView(row, INPUT)).toMatchObject({
      status: 'COMPLETE',
      gapPercent: 0,
      provenShare: 1,
      provenStretches: [[0, 12]],
    });
    expect(pointViews(row, INPUT, CostAxis.CAPITAL).map(({ atMostMore }) => atMostMore)).toEqual(
      row.points.map(() => '0.0000'),
    );
  });
});

describe('the row of a search that only has a bound', () => {
  const row = {
    evaluations: 10,
    kept: 2,
    points: [
      { benefit: 0, cost: 0, picks: [] },
      { benefit: 50_000, cost: 300, picks: [1] },
    ],
    proof: {
      bound: [
        [0, 0],
        [250, 60_000],
        [400, 90_000],
      ] as [number, number][],
      provenStretches: [[0, 249]] as [number, number][],
      provenShare: 0.25,
      hypervolume: 75,
      hypervolumeBound: 100,
    },
  };

  it('says how much more may be possible at the cost of each point, and overall', () => {
    const more = pointViews(row, INPUT, CostAxis.CAPITAL).map(({ atMostMore }) => atMostMore);
    expect(more).toEqual(['0.0000', '1.0000']);
    expect(certificateView(row, INPUT)).toMatchObject({
      status: 'BOUNDED',
      gapPercent: 25,
      provenStretches: [[0, 2.49]],
      bound: { costs: [0, 2.5, 4], benefits: [0, 6, 9] },
    });
  });
});

it('proves nothing before the proof has begun', () => {
  const row = { evaluations: 10, kept: 1, points: [{ benefit: 0, cost: 0, picks: [] }] };
  expect(certificateView(row, INPUT)).toMatchObject({ status: 'UNPROVEN', gapPercent: null, provenShare: 0 });
  expect(pointViews(row, INPUT, CostAxis.CAPITAL)[0].atMostMore).toBeNull();
});

function outcomeOf(search: ReturnType<typeof searchFrontier>) {
  let step = search.next();
  while (!step.done) step = search.next();
  return step.value;
}
