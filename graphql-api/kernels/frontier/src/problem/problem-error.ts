/** Refused input: names the key that is wrong and what stands there instead of what was expected. */
export class ProblemError extends Error {
  override readonly name = 'ProblemError';

  constructor(
    /** Where in the document, as one would write it in code: `items[3].uses[0]`; empty for the whole. */
    readonly path: string,
    readonly expected: string,
    readonly found: string,
  ) {
    super(`${path === '' ? 'The document' : path}: expected ${expected}, found ${found}.`);
  }
}
