import { Injectable } from '@nestjs/common';
import { In, type EntityManager } from 'typeorm';
import { quoteFaults, type CostAssumptions } from '@metewand/costing';
import type { Candidate } from '../candidates/entities/candidate.entity.js';
import { groupByKey } from '../common/request-loader.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import { Quote } from '../quotes/entities/quote.entity.js';
import { quoteInForce, type JudgedQuote, type QuoteInForce } from '../quotes/quote-in-force.js';
import { ExchangeRate } from '../rounds/entities/exchange-rate.entity.js';
import { Round } from '../rounds/entities/round.entity.js';
import { costOf } from './cost-memo.js';

/** A candidate with all its quotes, costed and judged, and the one by which it counts. */
export interface CostedCandidate {
  candidate: Candidate;
  /** By number. */
  quotes: JudgedQuote[];
  inForce: QuoteInForce | null;
}

interface RoundTerms {
  round: Round;
  assumptions: CostAssumptions;
}

/** Rows to kernel and back: costs every quote of the candidates under the assumptions of their rounds. */
@Injectable()
export class CostingService {
  constructor(private readonly organisations: OrganisationsService) {}

  /** In the order of the candidates. */
  async cost(em: EntityManager, candidates: readonly Candidate[]): Promise<CostedCandidate[]> {
    if (candidates.length === 0) return [];
    const ids = candidates.map(({ id }) => id);
    const termsByRound = await this.termsOf(em, [...new Set(candidates.map(({ roundId }) => roundId))]);
    const quotes = await em.find(Quote, {
      where: { candidateId: In(ids) },
      order: { number: 'ASC', id: 'ASC' },
    });
    const quotesOf = groupByKey(ids, quotes, ({ candidateId }) => candidateId);
    return candidates.map((candidate, i) => {
      const terms = termsByRound.get(candidate.roundId) as RoundTerms;
      const judged = quotesOf[i].map((quote) => judge(quote, candidate, terms));
      return { candidate, quotes: judged, inForce: quoteInForce(judged, candidate.keptQuoteId) };
    });
  }

  private async termsOf(em: EntityManager, roundIds: string[]): Promise<Map<string, RoundTerms>> {
    const { currency } = await this.organisations.current();
    const rounds = await em.findBy(Round, { id: In(roundIds) });
    const rates = await em.findBy(ExchangeRate, { roundId: In(roundIds) });
    return new Map(
      rounds.map((round) => {
        const own = rates.filter(({ roundId }) => roundId === round.id);
        return [round.id, { round, assumptions: assumptionsOf(round, own, currency) }];
      }),
    );
  }
}

function assumptionsOf(round: Round, rates: readonly ExchangeRate[], currency: string): CostAssumptions {
  return {
    currency,
    discountRate: round.discountRate,
    vatRate: round.vatRate,
    timing: round.paymentTiming,
    exchangeRates: Object.fromEntries(rates.map((rate) => [rate.currency, rate.rate])),
  };
}

function judge(quote: Quote, candidate: Candidate, { round, assumptions }: RoundTerms): JudgedQuote {
  return { quote, faults: quoteFaults(quote, round), cost: costOf(quote, candidate, assumptions) };
}
