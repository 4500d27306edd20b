export type MoneyProblem =
  | 'UNKNOWN_CURRENCY'
  | 'MIXED_CURRENCIES'
  | 'NOT_AN_AMOUNT'
  | 'TOO_MANY_DECIMALS'
  | 'TOO_LARGE'
  | 'NOT_A_RATE'
  | 'NOT_SHARES';

/** Why an amount or a rate was refused; the message says what was expected and can be shown to a person. */
export class MoneyError extends Error {
  constructor(
    readonly problem: MoneyProblem,
    message: string,
  ) {
    super(message);
    this.name = 'MoneyError';
  }
}
