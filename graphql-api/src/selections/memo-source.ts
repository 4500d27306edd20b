import type { Picks, Problem } from '@metewand/frontier';
import type { PricedCandidate, RoundCosts } from '../costing/round-costs.service.js';
import type { Run } from '../frontier/entities/run.entity.js';
import type { RunInput, RunResultRow } from '../frontier/run-result.js';
import type { Limit } from '../limits/entities/limit.entity.js';
import type { ExchangeRate } from '../rounds/entities/exchange-rate.entity.js';
import type { Round } from '../rounds/entities/round.entity.js';
import type { Benefit } from '../scoring/benefits.service.js';
import type { Criterion } from '../scoring/entities/criterion.entity.js';

/** Everything a memo is written from: the round as it is when the portfolio is submitted. */
export interface MemoSource {
  round: Round;
  run: Run;
  result: RunResultRow;
  problem: Problem;
  input: RunInput;
  costs: RoundCosts;
  benefits: ReadonlyMap<string, Benefit>;
  limits: readonly Limit[];
  criteria: readonly Criterion[];
  exchangeRates: readonly ExchangeRate[];
  /** The portfolio, as indices of the run's items. */
  picks: readonly number[];
}

/** The portfolio as the search's documents write it. */
export function picksOf({ input, picks }: Pick<MemoSource, 'input' | 'picks'>): Picks {
  return Object.fromEntries(picks.map((index) => [input.items[index].code, 1]));
}

/** The candidates of the portfolio with their quotes in force, by code. */
export function chosenOf({ costs, input, picks }: MemoSource): PricedCandidate[] {
  const ids = new Set(picks.map((index) => input.items[index].candidateId));
  return costs.priced.filter(({ candidate }) => ids.has(candidate.id));
}
