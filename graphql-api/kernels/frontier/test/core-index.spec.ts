import { coreIndex } from '../src/explain/core-index.js';
import { solveByTrying } from './all-portfolios.js';
import { twoNeedsAndAHoist } from './examples.js';

describe('the core index', () => {
  const problem = twoNeedsAndAHoist();
  const result = solveByTrying(problem);

  it('is the share of the portfolios on the frontier that hold an item, or any of a group', () => {
    // costs 0, 12, 24, 36 (hoists), 49 (scanner-b, viewer), 52, 64, 76 (scanner-b, hoists), 91 (scanner-a, hoists)
    const index = coreIndex(problem, result);
    expect(index).toMatchObject({ portfolios: 9, proven: true });
    expect(index.items).toEqual([
      { name: 'scanner-a', holding: 1, share: 1 / 9, standing: 'borderline' },
      { name: 'scanner-b', holding: 4, share: 4 / 9, standing: 'borderline' },
      { name: 'hoist', holding: 7, share: 7 / 9, standing: 'borderline' },
      { name: 'viewer', holding: 1, share: 1 / 9, standing: 'borderline' },
    ]);
    expect(index.groups).toEqual([{ name: 'scanner', holding: 5, share: 5 / 9, standing: 'borderline' }]);
  });

  it('counts those within a window of cost', () => {
    const { portfolios, items, groups } = coreIndex(problem, result, { from: 52, to: 91 });
    expect(portfolios).toBe(4);
    expect(items.map(({ standing }) => standing)).toEqual(['borderline', 'borderline', 'core', 'exterior']);
    expect(groups[0].standing).toBe('core');
    expect(coreIndex(problem, result, { from: 1, to: 2 }).items[0]).toMatchObject({ share: 0, holding: 0 });
  });

  it('says whether the points are proven to be all', () => {
    const bounded = { ...result, status: 'bounded' as const, provenStretches: [[0, 60] as const] };
    expect(coreIndex(problem, bounded).proven).toBe(false);
    expect(coreIndex(problem, bounded, { from: 10, to: 60 }).proven).toBe(true);
    expect(coreIndex(problem, bounded, { from: 10, to: 61 }).proven).toBe(false);
    expect(coreIndex(problem, { ...result, status: 'unproven' }, { from: 0, to: 1 }).proven).toBe(false);
  });
});
