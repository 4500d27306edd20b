/** Portfolios on a page of the table. */
export const TABLE_PAGE_SIZE = 50;

/** The page of the table that holds the portfolio at `place`. */
export function pageOf(place: number): number {
  return Math.floor(place / TABLE_PAGE_SIZE) + 1;
}
