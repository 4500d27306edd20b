/**
 * Where a portfolio would have to lie that none of these points of three objectives matches or beats: in zones cheaper
 * than u1 in cost, cheaper than u2 in second cost and above u3 in benefit. Each point cuts the zones it lies in into
 * three (local upper bounds; Klamroth, Lacour and Vanderpooten 2015, "On the representation of the search region in
 * multi-objective optimization"; from memory). The points are complete if every zone is empty.
 */
export function surfaceQuestions(points) {
  let zones = [[Infinity, Infinity, -Infinity]];
  for (const { cost, secondCost, benefit } of points) {
    const isInside = ([u1, u2, u3]) => cost < u1 && secondCost < u2 && benefit > u3;
    const cut = zones.filter(isInside).flatMap(([u1, u2, u3]) => [
      [cost, u2, u3],
      [u1, secondCost, u3],
      [u1, u2, benefit],
    ]);
    zones = [...zones.filter((zone) => !isInside(zone)), ...outermost(cut)];
  }
  return zones.map(([u1, u2, most]) => ({
    path: 'points',
    within: { costMost: u1 - 1, secondCostMost: u2 - 1 },
    most,
  }));
}

/** Zones that lie in no other one; of equal ones the first. */
function outermost(zones) {
  const liesIn = (one, other) => one[0] <= other[0] && one[1] <= other[1] && one[2] >= other[2];
  return zones.filter(
    (zone, index) =>
      !zones.some(
        (other, place) => place !== index && liesIn(zone, other) && (!liesIn(other, zone) || place < index),
      ),
  );
}
