/** The names of sites, departments, vendors or criteria, to be looked up. */
export function namesById(rows: readonly { id: string; name: string }[]): Map<string, string> {
  return new Map(rows.map(({ id, name }) => [id, name]));
}
