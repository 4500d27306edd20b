import { Injectable } from '@nestjs/common';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import type { Quote } from '../quotes/entities/quote.entity.js';
import type { JudgedQuote, QuoteInForceReason } from '../quotes/quote-in-force.js';
import { Round } from '../rounds/entities/round.entity.js';
import { findOrThrow } from '../tenancy/find-or-throw.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { CostingService, type CostedCandidate } from './costing.service.js';

/** A candidate by its quote in force. Amounts are gross, in minor units of the organisation's currency. */
export interface PricedCandidate {
  candidate: Candidate;
  quote: Quote;
  reason: QuoteInForceReason;
  capitalMinor: number;
  lifeCycleCostMinor: number;
  equivalentAnnualCostMinor: number;
  runningYearlyMinor: number;
  /** Less what the replaced unit costs; below zero is a saving. */
  addedRunningYearlyMinor: number;
  /** All its quotes by number, the one in force among them. */
  quotes: JudgedQuote[];
}

/** A candidate without a usable quote; `quotes` says what is wrong with each, and may be empty. */
export interface UnpricedCandidate {
  candidate: Candidate;
  quotes: JudgedQuote[];
}

export interface RoundCosts {
  /** The organisation's currency. */
  currency: string;
  /** By code, as `unpriced`. */
  priced: PricedCandidate[];
  unpriced: UnpricedCandidate[];
}

@Injectable()
export class RoundCostsService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly organisations: OrganisationsService,
    private readonly costing: CostingService,
  ) {}

  /** Every candidate of the round with whole-number figures. An unknown round is NOT_FOUND. */
  ofRound(roundId: string): Promise<RoundCosts> {
    return this.db.transaction(async (em) => {
      await findOrThrow(em, Round, 'round', roundId);
      const { currency } = await this.organisations.current();
      const candidates = await em.find(Candidate, { where: { roundId }, order: { code: 'ASC' } });
      const costed = await this.costing.cost(em, candidates);
      return {
        currency,
        priced: costed.flatMap((each) => priced(each) ?? []),
        unpriced: costed
          .filter(({ inForce }) => !inForce)
          .map(({ candidate, quotes }) => ({ candidate, quotes })),
      };
    });
  }
}

/** What these are bought for together, in minor units. */
export function capitalOf(priced: readonly { capitalMinor: number }[]): number {
  return priced.reduce((sum, { capitalMinor }) => sum + capitalMinor, 0);
}

function priced({ candidate, quotes, inForce }: CostedCandidate): PricedCandidate | null {
  if (!inForce) return null;
  const { quote, cost } = inForce.judged;
  return {
    candidate,
    quote,
    reason: inForce.reason,
    capitalMinor: cost.capitalGrossMinor,
    lifeCycleCostMinor: cost.lifeCycleCostMinor,
    equivalentAnnualCostMinor: cost.equivalentAnnualCostMinor,
    runningYearlyMinor: cost.runningYearlyGrossMinor,
    addedRunningYearlyMinor: cost.incrementalRunningYearlyMinor,
    quotes,
  };
}
