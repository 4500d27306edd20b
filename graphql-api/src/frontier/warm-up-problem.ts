import { PROBLEM_FORMAT, Random, type Item, type Problem } from '@metewand/frontier';

/** A problem of the size and kind of a round, of random figures, to make a thread run through the whole search. */
export function warmUpProblem(): Problem {
  const random = new Random(1);
  const from = (least: number, most: number): number => least + random.below(most - least + 1);
  const limits = ['days', 'area', 'running cost'].map((name) => ({ name, most: 300 }));
  const items = Array.from({ length: ITEMS }, (_, index): Item => {
    return {
      id: `${index}`,
      benefit: from(10_000, 500_000),
      cost: from(500_000, 20_000_000),
      uses: limits.map(() => from(0, 20)),
      ...(index % 3 === 0 ? { oneOf: `${index % 5}` } : {}),
      ...(index % 7 === 1 ? { most: 2 } : {}),
      ...(index % 9 === 5 ? { needs: [[`${index - 1}`, `${index - 2}`]] } : {}),
    };
  });
  const ward = items.filter((_, index) => index % 4 === 0).map(({ id }) => id);
  return {
    format: PROBLEM_FORMAT,
    ceiling: 220_000_000,
    limits,
    items,
    counts: [{ name: 'ward', items: ward, least: 1, most: 6 }],
  };
}

const ITEMS = 60;
