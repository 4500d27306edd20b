import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { quoteFaults } from '@metewand/costing';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { namesById } from '../common/names-by-id.js';
import { Round } from '../rounds/entities/round.entity.js';
import { findOrThrow } from '../tenancy/find-or-throw.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { QuotePageArgs } from './dto/quote-page.args.js';
import { Quote } from './entities/quote.entity.js';
import { Vendor } from './entities/vendor.entity.js';
import type { QuotePage } from './models/quote-page.model.js';

/** The quotes of a round, page by page. A round has at most some thousands, so they are sifted in memory. */
@Injectable()
export class QuoteListService {
  constructor(private readonly db: TenantDatabase) {}

  page({ roundId, filter, page, pageSize }: QuotePageArgs): Promise<QuotePage> {
    return this.db.transaction(async (em) => {
      const round = await findOrThrow(em, Round, 'round', roundId);
      const candidates = await em.find(Candidate, { where: { roundId }, order: { code: 'ASC' } });
      const quotes = await em.find(Quote, {
        where: { candidateId: In(candidates.map(({ id }) => id)) },
        order: { number: 'ASC', id: 'ASC' },
      });
      const vendors = await em.findBy(Vendor, { id: In(quotes.map(({ vendorId }) => vendorId)) });
      const inOrder = sortByCandidate(quotes, candidates);
      const faulty = filter?.faultyOnly
        ? inOrder.filter((quote) => quoteFaults(quote, round).length > 0)
        : inOrder;
      const found = search(faulty, filter?.search ?? '', candidates, vendors);
      const start = (page - 1) * pageSize;
      return { items: found.slice(start, start + pageSize), total: found.length, page, pageSize };
    });
  }
}

function sortByCandidate(quotes: readonly Quote[], candidates: readonly Candidate[]): Quote[] {
  const places = new Map(candidates.map(({ id }, place) => [id, place]));
  const placeOf = ({ candidateId }: Quote) => places.get(candidateId) ?? 0;
  return [...quotes].sort((left, right) => placeOf(left) - placeOf(right));
}

function search(
  quotes: Quote[],
  wanted: string,
  candidates: readonly Candidate[],
  vendors: readonly Vendor[],
): Quote[] {
  if (!wanted) return quotes;
  const candidateWords = new Map(candidates.map(({ id, code, name }) => [id, `${code} ${name}`]));
  const vendorWords = namesById(vendors);
  const sought = wanted.toLowerCase();
  return quotes.filter(({ number, candidateId, vendorId }) =>
    [number, candidateWords.get(candidateId), vendorWords.get(vendorId)].some((text) =>
      text?.toLowerCase().includes(sought),
    ),
  );
}
