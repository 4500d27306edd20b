import { Random } from '@metewand/frontier';

/**
 * A seeded purchasing round of a realistic kind: needs of 1 to 5 alternatives of which at most one is bought, costs
 * spread log-uniformly over a factor of nearly 40, alternatives of a need alike but for noise, capacities at 45 to
 * 60 % of what buying an average alternative for every need would use, a ceiling at 55 % of its cost, links between
 * needs, pieces, a few items mandatory or left out, and a least and most number of pieces per department.
 *
 * @param alternatives how many items
 * @param capacities how many limits
 * @param addedBenefit if given, benefit is cost plus this constant: strongly correlated, the hard family
 * @param money `small`: up to some hundreds; `minor`: a hundred times that and odd cents; `tens`: a tenth of it
 */
export function anInstance({ alternatives, seed, capacities = 3, addedBenefit, money = 'small' }) {
  const draw = drawFrom(seed);
  const drawn = drawItems(draw, alternatives, capacities);
  linkNeeds(draw, drawn);
  const needs = byNeed(drawn);
  const ceiling = Math.round(0.55 * sumOfMeans(needs, ({ cost }) => cost));
  const limits = Array.from({ length: capacities }, (_, index) => ({
    name: `capacity ${index + 1}`,
    most: Math.round(draw.between(0.45, 0.6) * sumOfMeans(needs, ({ uses }) => uses[index])),
  }));
  const choices = drawChoices(draw, drawn, ceiling);
  if (addedBenefit !== undefined) for (const item of drawn) item.benefit = item.cost + addedBenefit;
  for (const item of drawn) item.cost = costIn(money, item.cost, draw);
  return {
    format: 'metewand-problem/1',
    name: nameOf({ alternatives, seed, capacities, addedBenefit, money }),
    ceiling: Math.round(UNITS[money] * ceiling),
    limits,
    items: drawn.map(itemOf),
    ...choices,
    counts: departmentCounts(needs, drawn),
  };
}

/** An instance's description in one line. */
export function nameOf({ alternatives, seed, capacities = 3, addedBenefit, money = 'small' }) {
  const kind = addedBenefit === undefined ? '' : `, benefit = cost + ${addedBenefit}`;
  const units = money === 'small' ? '' : `, money in ${money === 'minor' ? 'minor units' : 'tens'}`;
  return `${alternatives} alternatives, ${capacities} capacities${kind}${units}, seed ${seed}`;
}

const DEPARTMENTS = 4;
const UNITS = { small: 1, minor: 100, tens: 0.1 };

function costIn(money, cost, draw) {
  if (money === 'minor') return UNITS.minor * cost + draw.whole(-49, 50);
  return Math.max(1, Math.round(UNITS[money] * cost));
}

/** @returns numbers by seed: `between` real, `whole` with both ends included, `chance` true in so many of 1. */
export function drawFrom(seed) {
  const random = new Random(seed);
  return {
    between: (low, high) => low + random.fraction() * (high - low),
    whole: (low, high) => low + random.below(high - low + 1),
    chance: (share) => random.fraction() < share,
    below: (bound) => random.below(bound),
  };
}

function drawItems(draw, alternatives, capacities) {
  const items = [];
  for (let need = 0; items.length < alternatives; need++) {
    const wanted = draw.chance(0.35) ? 1 : draw.whole(2, 5);
    const size = Math.min(wanted, alternatives - items.length);
    const common = {
      need,
      size,
      benefit: draw.whole(10, 100),
      cost: 5 * Math.exp(draw.between(0, 3.6)),
      department: draw.below(DEPARTMENTS),
      uses: Array.from({ length: capacities }, () => draw.whole(1, 30)),
      most: size === 1 && draw.chance(0.3) ? draw.whole(2, 4) : 1,
    };
    for (let place = 0; place < size; place++) items.push(drawAlternative(draw, common));
  }
  return items;
}

/** A bigger alternative of the same need costs more and brings more, but not by as much. */
function drawAlternative(draw, { benefit, cost, uses, ...common }) {
  const scale = draw.between(0.6, 1.4);
  const noise = () => draw.between(0.85, 1.15);
  return {
    ...common,
    benefit: Math.max(1, Math.round(benefit * (0.5 + 0.5 * scale) * noise())),
    cost: Math.max(1, Math.round(cost * scale * noise())),
    uses: uses.map((use) => Math.round(use * draw.between(0.6, 1.4))),
  };
}

/** One item in eight draws a partner; only an earlier one of another need, without a partner of its own, will do. */
function linkNeeds(draw, items) {
  for (const [place, item] of items.entries()) {
    if (!draw.chance(0.12)) continue;
    const partner = draw.below(items.length);
    if (partner < place && items[partner].partner === undefined && items[partner].need !== item.need) {
      item.partner = partner;
    }
  }
}

/** What an average alternative of every need takes, bought in all its pieces. */
function sumOfMeans(needs, figure) {
  const meanOf = (members) =>
    members.reduce((sum, item) => sum + figure(item) * item.most, 0) / members.length;
  return needs.reduce((sum, members) => sum + meanOf(members), 0);
}

function drawChoices(draw, items, ceiling) {
  const mustInclude = [];
  const leaveOut = [];
  const needsSettled = new Set();
  for (const [place, { need, cost, partner }] of items.entries()) {
    const share = draw.between(0, 1);
    if (share >= 0.04) continue;
    if (share >= 0.02) leaveOut.push(idOf(place));
    else if (partner === undefined && cost < ceiling / 8 && !needsSettled.has(need)) {
      needsSettled.add(need);
      mustInclude.push(idOf(place));
    }
  }
  return { mustInclude, leaveOut };
}

function departmentCounts(needs, items) {
  return Array.from({ length: DEPARTMENTS }, (_, department) => {
    const its = needs.filter(([first]) => first.department === department);
    const pieces = its.reduce((sum, [first]) => sum + first.most, 0);
    return {
      name: `department ${department + 1}`,
      items: items.flatMap((item, place) => (item.department === department ? [idOf(place)] : [])),
      least: its.length > 3 ? 1 : 0,
      most: Math.max(1, Math.ceil(0.6 * pieces)),
    };
  });
}

function byNeed(items) {
  const needs = [];
  for (const item of items) (needs[item.need] ??= []).push(item);
  return needs;
}

function itemOf({ benefit, cost, uses, most, need, size, partner }, place) {
  return {
    id: idOf(place),
    benefit,
    cost,
    uses,
    ...(size > 1 ? { oneOf: `need ${need + 1}` } : {}),
    ...(most > 1 ? { most } : {}),
    ...(partner === undefined ? {} : { needs: [[idOf(partner)]] }),
  };
}

function idOf(place) {
  return `alternative ${place + 1}`;
}
