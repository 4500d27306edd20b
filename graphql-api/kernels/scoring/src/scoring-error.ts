/** Criteria or scores that cannot be combined; the message says what was expected and can be shown to a person. */
export class ScoringError extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'ScoringError';
  }
}
