/**
 * The place of the knee by expected marginal utility: the point that would be missed most (Branke, Deb, Dierolf, Osswald
 * 2004, "Finding knees in multi-objective optimization"; from memory). Undefined where no point but the two ends is ever
 * the best one. Of equal points the cheapest.
 */
export function marginalUtilityKnee(
  points: readonly (readonly [cost: number, benefit: number])[],
): number | undefined {
  let knee: number | undefined;
  let most = 0;
  for (const [place, utility] of marginalUtilities(points).entries()) {
    const isEnd = place === 0 || place === points.length - 1;
    if (isEnd || utility <= most) continue;
    most = utility;
    knee = place;
  }
  return knee;
}

/**
 * The expected marginal utility of each point. Both axes are stretched to length one; somebody who weighs cost with w
 * and missing benefit with 1 - w wants the least of w * cost + (1 - w) * missing benefit. A point's marginal utility
 * for w is how much more the next best one would come to, where it is the best, and 0 elsewhere; its expectation
 * is over w evenly spread from 0 to 1. Not by drawing weights but exactly: only points of the lower convex hull are
 * ever best; while one is, the next best is on the hull of what remains between its two neighbours, and the difference
 * is linear in w between the corners of that. The ends have theirs too, as the last ones before a neighbour takes over.
 *
 * Points [cost, benefit] in order of cost, rising in both. All 0 for fewer than three points. O(n).
 */
export function marginalUtilities(points: readonly (readonly [cost: number, benefit: number])[]): number[] {
  const utilities = points.map(() => 0);
  if (points.length < 3) return utilities;
  const stretched = stretch(points);
  const hull = hullOf(stretched, 0, points.length - 1, undefined);
  for (const [corner, place] of hull.entries()) {
    const from = corner === 0 ? 0 : hull[corner - 1];
    const to = corner === hull.length - 1 ? place : hull[corner + 1];
    // what is best without this point: the corners between its neighbours, the neighbours included
    const others = hullOf(stretched, from, to, place);
    utilities[place] = expectedLoss(stretched, place, others);
  }
  return utilities;
}

/** Cost and missing benefit, each from 0 to 1. */
type Stretched = readonly (readonly [cost: number, missing: number])[];

function stretch(points: readonly (readonly [number, number])[]): Stretched {
  const [firstCost, firstBenefit] = points[0];
  const [lastCost, lastBenefit] = points[points.length - 1];
  return points.map(([cost, benefit]) => [
    (cost - firstCost) / (lastCost - firstCost),
    (lastBenefit - benefit) / (lastBenefit - firstBenefit),
  ]);
}

/** Corners of the lower left convex hull of the points from..to but one, in order of cost (Andrew's monotone chain). */
function hullOf(points: Stretched, from: number, to: number, without: number | undefined): number[] {
  const hull: number[] = [];
  for (let place = from; place <= to; place++) {
    if (place === without) continue;
    while (hull.length > 1 && !turnsLeft(points, hull[hull.length - 2], hull[hull.length - 1], place))
      hull.pop();
    hull.push(place);
  }
  return hull;
}

function turnsLeft(points: Stretched, a: number, b: number, c: number): boolean {
  const [[ax, ay], [bx, by], [cx, cy]] = [points[a], points[b], points[c]];
  return (bx - ax) * (cy - ay) - (by - ay) * (cx - ax) > 0;
}

/** The integral over w of what the best of `others` comes to more than the point, as far as it is more. */
function expectedLoss(points: Stretched, place: number, others: readonly number[]): number {
  // from the dearest, which is best for w = 0, to the cheapest
  const inTurn = [...others].reverse();
  let [sum, from] = [0, 0];
  for (const [turn, other] of inTurn.entries()) {
    const next = inTurn[turn + 1];
    const until = next === undefined ? 1 : weightOfTie(points, other, next);
    sum += positivePart(points, place, other, from, until);
    from = until;
  }
  return sum;
}

/** The weight of cost for which two points are equally good. */
function weightOfTie(points: Stretched, dearer: number, cheaper: number): number {
  const moreCost = points[dearer][0] - points[cheaper][0];
  const moreMissing = points[cheaper][1] - points[dearer][1];
  return moreMissing / (moreCost + moreMissing);
}

/** The integral over w in from..until of the positive part of one point's sum less another's: a line in w. */
function positivePart(points: Stretched, place: number, other: number, from: number, until: number): number {
  const difference = (w: number): number =>
    w * (points[other][0] - points[place][0]) + (1 - w) * (points[other][1] - points[place][1]);
  const [atStart, atEnd] = [difference(from), difference(until)];
  if (atStart <= 0 && atEnd <= 0) return 0;
  if (atStart >= 0 && atEnd >= 0) return ((atStart + atEnd) / 2) * (until - from);
  const zero = from + ((until - from) * atStart) / (atStart - atEnd);
  return atStart > 0 ? (atStart / 2) * (zero - from) : (atEnd / 2) * (until - zero);
}
