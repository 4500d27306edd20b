/** An input that cannot be costed. `field` names it as in the input; the message can be shown to a person. */
export class CostingError extends Error {
  constructor(
    readonly field: string,
    expectation: string,
  ) {
    super(`${field} ${expectation}`);
    this.name = 'CostingError';
  }
}
