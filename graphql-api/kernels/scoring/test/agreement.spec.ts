import { kendallsW, midRanks } from '../src/index.js';

const decimals = (value: number | null, digits: number) => Number(value?.toFixed(digits));

describe("Kendall's W", () => {
  it('KEND-1: ProofWiki, coefficient of concordance, example 1: 4 judges, 3 competitors [seen]', () => {
    const ranks = [
      [1, 1, 2, 3],
      [3, 2, 3, 1],
      [2, 3, 1, 2],
    ];
    expect(kendallsW(ranks)).toEqual({ s: 2, w: 0.0625, chiSquare: 0.5, degreesOfFreedom: 2 });
  });

  it('KEND-2: public teaching sheet, 10 projects, 4 judges [S seen, W computed]', () => {
    const ranks = [
      [1, 2, 3, 4],
      [3, 1, 2, 2],
      [4, 4, 1, 3],
      [5, 5, 5, 1],
      [2, 6, 7, 6],
      [8, 3, 4, 7],
      [6, 8, 6, 5],
      [7, 7, 8, 9],
      [10, 10, 9, 8],
      [9, 9, 10, 10],
    ];
    const { s, w } = kendallsW(ranks);
    expect(s).toBe(1048);
    expect(decimals(w, 3)).toBe(0.794);
  });

  it('KEND-3: public teaching sheet, 8 essays, 3 judges [inputs seen, answer computed]', () => {
    const ranks = [
      [8, 7, 8],
      [6, 5, 6],
      [4, 6, 5],
      [1, 2, 1],
      [3, 3, 2],
      [2, 1, 3],
      [5, 4, 4],
      [7, 8, 7],
    ];
    const { s, w } = kendallsW(ranks);
    expect([s, decimals(w, 3)]).toEqual([354, 0.937]);
  });

  it('reaches 1 for full agreement, also with ties', () => {
    expect(
      kendallsW([
        [1, 1, 1],
        [2, 2, 2],
        [3, 3, 3],
      ]).w,
    ).toBe(1);
    expect(
      kendallsW([
        [1.5, 1.5],
        [1.5, 1.5],
        [3, 3],
      ]).w,
    ).toBe(1);
  });

  it('has no answer when every judge ranks everything alike', () => {
    expect(
      kendallsW([
        [2, 2],
        [2, 2],
        [2, 2],
      ]),
    ).toEqual({ s: 0, w: null, chiSquare: null, degreesOfFreedom: 2 });
  });

  it('gives equal scores the mean of their places', () => {
    expect(midRanks([40, 90, 40, 10])).toEqual([2.5, 1, 2.5, 4]);
  });

  it('refuses one judge, one item and gaps', () => {
    expect(() => kendallsW([[1], [2]])).toThrow('at least two items and two judges');
    expect(() => kendallsW([[1, 2]])).toThrow('at least two items and two judges');
    expect(() => kendallsW([[1, 2], [2]])).toThrow('Every judge must rank every item.');
  });
});
