import type { Problem } from '@metewand/frontier';

/** Benefit and cost go together, so that bounds decide little: some four seconds of one core. */
export function knottyProblem(): Problem {
  let state = 3;
  const random = () => (state = (state * 48_271) % 2_147_483_647) / 2_147_483_647;
  const items = Array.from({ length: 44 }, (_, index) => {
    const cost = 10 + Math.floor(random() * 90);
    const uses = [1 + Math.floor(random() * 9), 1 + Math.floor(random() * 9)];
    return { id: `I${index}`, cost, benefit: cost + 20, uses };
  });
  const limits = ['days', 'power'].map((name) => ({ name, most: 88 }));
  const ceiling = Math.floor(items.reduce((sum, { cost }) => sum + cost, 0) / 2);
  return { format: 'metewand-problem/1', items, limits, ceiling };
}
