import { Random } from '../src/local-search/random.js';
import { dominatedVolume, type SurfacePoint } from '../src/three-objectives/dominated-volume.js';

const REFERENCE = { benefit: 0, cost: 10, secondCost: 10 };

describe('the volume a surface dominates', () => {
  it('is a box for one point, and nothing for one beyond the reference', () => {
    expect(dominatedVolume([[4, 5, 7]], REFERENCE)).toBe(6 * 5 * 3);
    expect(dominatedVolume([], REFERENCE)).toBe(0);
    expect(
      dominatedVolume(
        [
          [10, 5, 7],
          [4, 0, 7],
          [4, 5, 11],
        ],
        REFERENCE,
      ),
    ).toBe(0);
  });

  it('counts once what two points dominate', () => {
    const points: SurfacePoint[] = [
      [4, 5, 7],
      [2, 3, 8],
    ];
    expect(dominatedVolume(points, REFERENCE)).toBe(90 + 8 * 3 * 2 - 6 * 3 * 2);
  });

  it('agrees with inclusion and exclusion on small sets, beaten points and ties among them', () => {
    for (let seed = 1; seed <= 300; seed++) {
      const random = new Random(seed);
      const range = 3 + random.below(10);
      const points = Array.from({ length: 1 + random.below(9) }, (): SurfacePoint => [
        random.below(range),
        random.below(range),
        random.below(range),
      ]);
      expect(dominatedVolume(points, REFERENCE)).toBe(byInclusionAndExclusion(points));
    }
  });
});

/** The boxes of all subsets' common parts, added and taken away in turn. */
function byInclusionAndExclusion(points: readonly SurfacePoint[]): number {
  let volume = 0;
  for (let subset = 1; subset < 2 ** points.length; subset++) {
    const members = points.filter((_, index) => (subset >> index) % 2 === 1);
    const cost = Math.max(...members.map((point) => point[0]));
    const benefit = Math.min(...members.map((point) => point[1]));
    const secondCost = Math.max(...members.map((point) => point[2]));
    const common =
      Math.max(0, REFERENCE.cost - cost) *
      Math.max(0, benefit - REFERENCE.benefit) *
      Math.max(0, REFERENCE.secondCost - secondCost);
    volume += members.length % 2 === 1 ? common : -common;
  }
  return volume;
}
