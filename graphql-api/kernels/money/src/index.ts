export type { RoundedTogether } from './allocate.js';
export { allocate, roundTogether } from './allocate.js';
export { isKnownCurrency, minorDigits } from './currency.js';
export type { MoneyProblem } from './money-error.js';
export { MoneyError } from './money-error.js';
export type { Money } from './money.js';
export {
  add,
  convert,
  formatDecimal,
  grossOf,
  minorExchangeRate,
  money,
  multiply,
  negate,
  netOf,
  parseMoney,
  subtract,
  sum,
} from './money.js';
export type { Rate } from './rate.js';
export { addRates, invertRate, multiplyRates, parseRate, rate, rateOfNumber, rateToNumber } from './rate.js';
export type { Rounding } from './rounding.js';
export { roundHalfEven, roundHalfUp } from './rounding.js';
