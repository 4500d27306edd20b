import { drawFrom } from './instances.mjs';

/**
 * A seeded problem in which any kind of limit and link may meet any other, for checks of correctness: 0 to 12 limits
 * with and without a least, uses that give back, groups, pieces, several needs of any of several items (in circles
 * too), either–or, counts, mandatory and left out items, a least benefit, free and worthless items, equal figures.
 * About one in seven has no feasible portfolio at all.
 */
export function aTangledProblem(seed, itemCount) {
  const draw = drawFrom(seed);
  const ids = Array.from({ length: itemCount }, (_, place) => `item ${place + 1}`);
  const limits = drawLimits(draw, itemCount);
  const items = ids.map((id) => drawItem(draw, id, ids, limits.length));
  const mustInclude = draw.chance(0.3) ? someOf(draw, ids, 1, 2) : [];
  const cost = items.reduce((sum, item) => sum + item.cost, 0);
  const benefit = items.reduce((sum, item) => sum + item.benefit, 0);
  return {
    format: 'metewand-problem/1',
    name: `${itemCount} tangled items, seed ${seed}`,
    ...(draw.chance(0.75) ? { ceiling: Math.round(draw.between(0.3, 0.9) * cost) } : {}),
    limits,
    items,
    mustInclude,
    leaveOut: (draw.chance(0.3) ? someOf(draw, ids, 1, 2) : []).filter((id) => !mustInclude.includes(id)),
    eitherOr: Array.from({ length: draw.whole(0, 2) }, () => someOf(draw, ids, 2, 3)),
    counts: Array.from({ length: draw.whole(0, 3) }, (_, index) => drawCount(draw, ids, index)),
    ...(draw.chance(0.2) ? { leastBenefit: Math.round(draw.between(0, 0.4) * benefit) } : {}),
  };
}

/** Mostly few limits, now and then up to 12. */
function drawLimits(draw, itemCount) {
  const many = draw.chance(0.15) ? draw.whole(4, 12) : draw.whole(0, 3);
  return Array.from({ length: many }, (_, index) => {
    const most = draw.whole(2 * itemCount, 5 * itemCount);
    const least = draw.chance(0.2) ? { least: draw.whole(-3, itemCount) } : {};
    return { name: `limit ${index + 1}`, most, ...least };
  });
}

function drawItem(draw, id, ids, limitCount) {
  const others = ids.filter((other) => other !== id);
  const needCount = draw.chance(0.25) ? draw.whole(1, 2) : 0;
  return {
    id,
    benefit: draw.chance(0.05) ? 0 : draw.whole(1, 30),
    cost: draw.chance(0.05) ? 0 : draw.whole(1, 25),
    uses: Array.from({ length: limitCount }, () => (draw.chance(0.1) ? -draw.whole(1, 4) : draw.whole(0, 9))),
    ...(draw.chance(0.4) ? { oneOf: `group ${draw.below(Math.ceil(ids.length / 4))}` } : {}),
    ...(draw.chance(0.15) ? { most: draw.whole(2, 3) } : {}),
    ...(needCount === 0
      ? {}
      : { needs: Array.from({ length: needCount }, () => someOf(draw, others, 1, 3)) }),
  };
}

function drawCount(draw, ids, index) {
  const items = someOf(draw, ids, 2, Math.ceil(ids.length / 2));
  const least = draw.chance(0.5) ? { least: draw.whole(0, 2) } : {};
  const most = draw.chance(0.7) ? { most: draw.whole(2, items.length) } : {};
  return { name: `ward ${index + 1}`, items, ...least, ...most };
}

/** So many different ids, fewer where there are not enough. */
function someOf(draw, ids, low, high) {
  const rest = [...ids];
  const wanted = Math.min(rest.length, draw.whole(low, Math.max(low, high)));
  return Array.from({ length: wanted }, () => rest.splice(draw.below(rest.length), 1)[0]);
}
