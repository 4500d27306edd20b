/** A problem of 400 candidates under three limits, whose proof takes some minutes. */
export function hardProblem() {
  let state = 3;
  const random = () => (state = (state * 48_271) % 2_147_483_647) / 2_147_483_647;
  const items = Array.from({ length: 400 }, (_, index) => {
    const uses = [
      1 + Math.floor(random() * 99),
      1 + Math.floor(random() * 99),
      1 + Math.floor(random() * 99),
    ];
    return {
      id: `I${index}`,
      cost: 1 + Math.floor(random() * 99),
      benefit: 1 + Math.floor(random() * 99),
      uses,
    };
  });
  const limits = ['days', 'power', 'area'].map((name) => ({ name, most: 5_000 }));
  const ceiling = Math.floor(items.reduce((sum, { cost }) => sum + cost, 0) / 2);
  return { format: 'metewand-problem/1', items, limits, ceiling };
}
