import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { quoteFaults } from '@metewand/costing';
import { AuditService } from '../audit/audit.service.js';
import { CandidatesService } from '../candidates/candidates.service.js';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { NotFoundError } from '../common/domain-error.js';
import type { Round } from '../rounds/entities/round.entity.js';
import { findOrThrow, lockVersion } from '../tenancy/find-or-throw.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { QuoteNotUsable, type KeepQuoteInput } from './dto/keep-quote.input.js';
import { Quote } from './entities/quote.entity.js';
import { Vendor } from './entities/vendor.entity.js';
import { faultWords } from './fault-words.js';

/** Keeping a certain quote of a candidate, whatever the round's rule would choose. */
@Injectable()
export class KeptQuotesService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly candidates: CandidatesService,
    private readonly audit: AuditService,
  ) {}

  keep({ candidateId, quoteId, reason, version }: KeepQuoteInput): Promise<Candidate | QuoteNotUsable> {
    return this.db.transaction(async (em) => {
      const { round } = await this.candidates.lockChangeable(em, candidateId);
      const candidate = await lockVersion(em, Candidate, 'candidate', candidateId, version);
      const quote = quoteId ? await quoteOf(em, candidate, quoteId) : null;
      const refusal = quote && refusalOf(quote, round);
      if (refusal) return refusal;
      candidate.keptQuoteId = quote?.id ?? null;
      candidate.keptReason = quote ? reason : '';
      await em.save(candidate);
      await this.record(em, candidate, quote, reason);
      return candidate;
    });
  }

  private async record(em: EntityManager, candidate: Candidate, quote: Quote | null, reason: string) {
    const vendor = quote && (await em.findOneByOrFail(Vendor, { id: quote.vendorId }));
    const detail = `${candidate.code} ${candidate.name}${reason && `: ${reason}`}`;
    const data = { number: quote?.number, vendor: vendor?.name, detail };
    await this.audit.record(em, 'quote.kept', { roundId: candidate.roundId, objectId: candidate.id, data });
  }
}

/** A quote of another candidate is as unknown here as one that does not exist. */
async function quoteOf(em: EntityManager, candidate: Candidate, quoteId: string): Promise<Quote> {
  const quote = await findOrThrow(em, Quote, 'quote', quoteId);
  if (quote.candidateId !== candidate.id) throw new NotFoundError('quote', quoteId);
  return quote;
}

function refusalOf(quote: Quote, round: Round): QuoteNotUsable | null {
  const faults = quoteFaults(quote, round).map((fault) => faultWords(fault, quote, round));
  return faults.length ? new QuoteNotUsable(quote.number, faults) : null;
}
