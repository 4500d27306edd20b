export type { CapitalisedInput, EconomicLife, EconomicLifeInput } from './annual-equivalent.js';
export { capitalisedCost, economicLife, equivalentAnnualCost } from './annual-equivalent.js';
export type { YearlyCost } from './cash-flow.js';
export { presentValue, presentValueOfYearly } from './cash-flow.js';
export type { CostedQuote } from './choose-quote.js';
export { chooseQuote } from './choose-quote.js';
export type { CostPart, CostPartKind } from './cost-parts.js';
export { CostingError } from './costing-error.js';
export type { Timing } from './discount.js';
export {
  capitalRecovery,
  discountFactor,
  growingPresentValue,
  sinkingFund,
  uniformPresentValue,
} from './discount.js';
export { escalate, nominalRate, realRate } from './escalation.js';
export type { DatedCost, LifeCycleCost, LifeCycleInput } from './life-cycle-cost.js';
export { lifeCycleCost } from './life-cycle-cost.js';
export type { CostYear } from './cost-years.js';
export type { QuoteCost } from './quote-cost.js';
export { costOfQuote } from './quote-cost.js';
export type { QuoteFault, QuoteRules, QuoteTerms } from './quote-faults.js';
export { quoteFaults } from './quote-faults.js';
export type { CandidateFigures, CostAssumptions, QuoteFigures } from './quote-figures.js';
