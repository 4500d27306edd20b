/**
 * A problem as genes for an evolutionary search, straight from the document, so that what is compared with the
 * kernel shares nothing with it. A gene is a group or an item without one; its options are so many pieces of one of
 * its items, or nothing (its first option then). Rows are sums between a least and a most; cost and benefit are the
 * first two.
 */
export function layOut(problem) {
  const rows = rowsOf(problem);
  const { genes, options } = genesOf(problem);
  const firstOption = new Int32Array(problem.items.length).fill(-1);
  for (const [option, { item }] of options.entries()) {
    if (item >= 0 && firstOption[item] < 0) firstOption[item] = option;
  }
  return {
    genes,
    geneOf: Int32Array.from(options, ({ gene }) => gene),
    itemOf: Int32Array.from(options, ({ item }) => item),
    terms: options.map((option) => termsOf(option, rows)),
    least: Float64Array.from(rows, ({ least }) => least),
    most: Float64Array.from(rows, ({ most }) => most),
    firstOption,
    links: linksOf(problem),
    taking: Int32Array.from([...options.keys()].filter((option) => options[option].item >= 0)),
  };
}

export const COST = 0;
export const BENEFIT = 1;

function rowsOf({ items, ceiling = Infinity, limits = [], counts = [], leastBenefit = -Infinity }) {
  const place = new Map(items.map(({ id }, index) => [id, index]));
  const each = (figure) => items.map(figure);
  return [
    { least: -Infinity, most: ceiling, perPiece: each(({ cost }) => cost) },
    { least: leastBenefit, most: Infinity, perPiece: each(({ benefit }) => benefit) },
    ...limits.map(({ most, least = -Infinity }, k) => ({
      least,
      most,
      perPiece: each(({ uses }) => uses?.[k] ?? 0),
    })),
    ...counts.map(({ items: ids, least = -Infinity, most = Infinity }) => {
      const counted = new Set(ids.map((id) => place.get(id)));
      return { least, most, perPiece: each((_, index) => (counted.has(index) ? 1 : 0)) };
    }),
  ];
}

function genesOf({ items, mustInclude = [], leaveOut = [] }) {
  const mandatory = new Set(mustInclude);
  const barred = new Set(leaveOut);
  const membersOf = new Map();
  for (const [index, { id, oneOf }] of items.entries()) {
    const key = oneOf === undefined ? index : `group ${oneOf}`;
    if (!membersOf.has(key)) membersOf.set(key, []);
    if (!barred.has(id)) membersOf.get(key).push(index);
  }
  const genes = [];
  const options = [];
  const add = (option) => genes.at(-1).push(options.push({ ...option, gene: genes.length - 1 }) - 1);
  for (const members of membersOf.values()) {
    const required = members.filter((index) => mandatory.has(items[index].id));
    genes.push([]);
    if (required.length === 0) add({ item: -1, pieces: 0 });
    for (const item of required.length > 0 ? required : members) {
      for (let pieces = 1; pieces <= (items[item].most ?? 1); pieces++) add({ item, pieces });
    }
  }
  return { genes, options };
}

/** The rows an option counts in, and what it adds to each. */
function termsOf({ item, pieces }, rows) {
  if (item < 0) return { rows: new Int32Array(0), values: new Float64Array(0) };
  const counting = [...rows.keys()].filter((row) => rows[row].perPiece[item] !== 0);
  return {
    rows: Int32Array.from(counting),
    values: Float64Array.from(counting, (row) => pieces * rows[row].perPiece[item]),
  };
}

function linksOf({ items, eitherOr = [] }) {
  const place = new Map(items.map(({ id }, index) => [id, index]));
  const places = (ids) => Int32Array.from(ids, (id) => place.get(id));
  return {
    needs: items.flatMap(({ needs = [] }, item) => needs.map((ids) => ({ item, anyOf: places(ids) }))),
    eitherOr: eitherOr.map(places),
  };
}
