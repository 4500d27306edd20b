/**
 * A problem as an integer program, straight from the document and without the kernel's own tables, so that a solver
 * of others can witness against the search: one whole column of pieces per item, and a yes-or-no column beside it
 * where a link asks whether the item is taken and there may be several pieces. The rows cost, secondCost and benefit
 * stand first, because their bounds change from question to question.
 *
 * Rows and benefit are divided by powers of two (exact in doubles) until no figure is above 1 024: solvers work with
 * absolute tolerances, and money in minor units would drown in them.
 */
export function toIntegerProgram(problem) {
  const columns = new Columns(problem);
  const benefit = columns.sum((item) => item.benefit);
  const rows = [
    row(
      columns.sum((item) => item.cost),
      -Infinity,
      problem.ceiling ?? Infinity,
    ),
    row(
      columns.sum((item) => item.secondCost ?? 0),
      -Infinity,
      Infinity,
    ),
    row(benefit, problem.leastBenefit ?? -Infinity, Infinity),
    ...limitRows(problem, columns),
    ...linkRows(problem, columns),
    ...columns.ties(),
  ];
  return {
    columnLower: columns.lower,
    columnUpper: columns.upper,
    rows,
    objective: benefit,
    itemCount: problem.items.length,
    /** The columns of a portfolio, as a solver is told of it. */
    columnsOf: (picks) => columns.of(picks),
  };
}

export const ROW = { cost: 0, secondCost: 1, benefit: 2 };

/** Bounds of a row as the solver gets them: half a unit beyond the whole number wherever the row is divided. */
export function dividedBounds({ lower, upper, divisor }) {
  const slack = divisor === 1 ? 0 : 0.5;
  return [(lower - slack) / divisor, (upper + slack) / divisor];
}

export function divisorOf(values) {
  let divisor = 1;
  for (const value of values) while (Math.abs(value) / divisor > 1024) divisor *= 2;
  return divisor;
}

function row(terms, lower, upper) {
  return { terms, lower, upper, divisor: divisorOf(terms.values()) };
}

/** Two columns per item at most: its pieces, and whether it is taken; they are one where there is only one piece. */
class Columns {
  lower;
  upper;
  #items;
  #place;
  #taken = new Map();

  constructor(problem) {
    const mandatory = new Set(problem.mustInclude);
    const leftOut = new Set(problem.leaveOut);
    this.#items = problem.items;
    this.#place = new Map(problem.items.map(({ id }, index) => [id, index]));
    this.lower = problem.items.map(({ id }) => (mandatory.has(id) ? 1 : 0));
    this.upper = problem.items.map(({ id, most = 1 }) => (leftOut.has(id) ? 0 : most));
    for (const id of linkedIds(problem)) this.#addTaken(id);
  }

  /** The terms of a sum over all pieces. */
  sum(ofPiece) {
    const terms = this.#items.map((item, index) => [index, ofPiece(item)]);
    return new Map(terms.filter(([, value]) => value !== 0));
  }

  pieces(id) {
    return this.#place.get(id);
  }

  taken(id) {
    return this.#taken.get(id) ?? this.pieces(id);
  }

  /** What ties the two columns of an item together: no piece untaken, nothing taken without a piece. */
  ties() {
    return [...this.#taken].flatMap(([id, taken]) => {
      const pieces = this.pieces(id);
      const most = new Map([
        [pieces, 1],
        [taken, -this.upper[pieces]],
      ]);
      const least = new Map([
        [pieces, 1],
        [taken, -1],
      ]);
      return [row(most, -Infinity, 0), row(least, 0, Infinity)];
    });
  }

  of(picks) {
    const values = new Float64Array(this.lower.length);
    for (const [id, pieces] of Object.entries(picks)) {
      values[this.pieces(id)] = pieces;
      values[this.taken(id)] = this.#taken.has(id) ? Math.min(1, pieces) : pieces;
    }
    return values;
  }

  #addTaken(id) {
    const pieces = this.pieces(id);
    if (this.upper[pieces] <= 1 || this.#taken.has(id)) return;
    this.#taken.set(id, this.lower.length);
    this.lower.push(this.lower[pieces]);
    this.upper.push(1);
  }
}

function linkedIds({ items, eitherOr = [] }) {
  return [
    ...items.filter(({ oneOf }) => oneOf !== undefined).map(({ id }) => id),
    ...items.flatMap(({ id, needs = [] }) => (needs.length > 0 ? [id, ...needs.flat()] : [])),
    ...eitherOr.flat(),
  ];
}

function limitRows({ limits = [], counts = [] }, columns) {
  return [
    ...limits.map(({ most, least = -Infinity }, index) =>
      row(
        columns.sum((item) => item.uses?.[index] ?? 0),
        least,
        most,
      ),
    ),
    ...counts.map(({ items, least = 0, most = Infinity }) =>
      row(new Map(items.map((id) => [columns.pieces(id), 1])), least, most),
    ),
  ];
}

function linkRows({ items, eitherOr = [] }, columns) {
  const atMostOne = (ids) => row(new Map(ids.map((id) => [columns.taken(id), 1])), -Infinity, 1);
  return [
    ...groupsOf(items).map(atMostOne),
    ...eitherOr.map(atMostOne),
    ...items.flatMap(({ id, needs = [] }) =>
      needs.filter((anyOf) => !anyOf.includes(id)).map((anyOf) => needRow(columns, id, anyOf)),
    ),
  ];
}

function needRow(columns, id, anyOf) {
  const terms = new Map(anyOf.map((other) => [columns.taken(other), 1]));
  return row(terms.set(columns.taken(id), -1), 0, Infinity);
}

function groupsOf(items) {
  const groups = new Map();
  for (const { id, oneOf } of items) {
    if (oneOf !== undefined) groups.set(oneOf, [...(groups.get(oneOf) ?? []), id]);
  }
  return [...groups.values()];
}
