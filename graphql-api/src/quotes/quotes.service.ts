import { Injectable } from '@nestjs/common';
import { Not, type EntityManager } from 'typeorm';
import { isKnownCurrency } from '@metewand/money';
import { AuditService } from '../audit/audit.service.js';
import { CandidatesService } from '../candidates/candidates.service.js';
import type { Candidate } from '../candidates/entities/candidate.entity.js';
import { DocumentsService } from '../documents/documents.service.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { findOrThrow, lockVersion } from '../tenancy/find-or-throw.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { CreateQuoteInput, QuoteFieldsInput, UpdateQuoteInput } from './dto/save-quote.input.js';
import {
  QuoteDatesReversed,
  QuoteNumberTaken,
  UnknownCurrency,
  type SaveQuoteRefusal,
} from './dto/save-quote.result.js';
import { Quote } from './entities/quote.entity.js';
import { discountProblem, figuresOf } from './quote-figures.js';
import { VendorsService } from './vendors.service.js';

@Injectable()
export class QuotesService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly rounds: RoundsService,
    private readonly candidates: CandidatesService,
    private readonly vendors: VendorsService,
    private readonly documents: DocumentsService,
    private readonly organisations: OrganisationsService,
    private readonly audit: AuditService,
  ) {}

  find(id: string): Promise<Quote> {
    return this.db.transaction((em) => findOrThrow(em, Quote, 'quote', id));
  }

  create({ candidateId, fields }: CreateQuoteInput): Promise<Quote | SaveQuoteRefusal> {
    return this.db.transaction(async (em) => {
      const { candidate } = await this.candidates.lockChangeable(em, candidateId);
      return this.save(em, candidate, em.create(Quote, { candidateId }), fields, 'quote.created');
    });
  }

  update({ id, version, fields }: UpdateQuoteInput): Promise<Quote | SaveQuoteRefusal> {
    return this.db.transaction(async (em) => {
      const { candidateId } = await findOrThrow(em, Quote, 'quote', id);
      const { candidate } = await this.candidates.lockChangeable(em, candidateId);
      const quote = await lockVersion(em, Quote, 'quote', id, version);
      return this.save(em, candidate, quote, fields, 'quote.changed');
    });
  }

  private async save(
    em: EntityManager,
    candidate: Candidate,
    quote: Quote,
    fields: QuoteFieldsInput,
    action: 'quote.created' | 'quote.changed',
  ): Promise<Quote | SaveQuoteRefusal> {
    const unknown = await this.currencyProblem(candidate.roundId, fields.currency);
    if (unknown) return unknown;
    if (fields.validUntil < fields.quoteDate)
      return new QuoteDatesReversed(fields.quoteDate, fields.validUntil);
    const figures = figuresOf(fields);
    const tooMuch = discountProblem(figures, fields.quantity, fields.currency);
    if (tooMuch) return tooMuch;
    const taken = await this.numberProblem(em, quote, fields);
    if (taken) return taken;
    const vendor = await this.vendors.findOrCreate(em, fields.vendorName);
    Object.assign(quote, columnsOf(fields), figures, { vendorId: vendor.id });
    await em.save(quote);
    if (fields.documentId) await this.documents.attach(em, fields.documentId, quote);
    const data = { number: quote.number, vendor: vendor.name, detail: `${candidate.code} ${candidate.name}` };
    await this.audit.record(em, action, { roundId: candidate.roundId, objectId: quote.id, data });
    return quote;
  }

  private async currencyProblem(roundId: string, currency: string): Promise<UnknownCurrency | null> {
    const own = (await this.organisations.current()).currency;
    const rates = await this.rounds.exchangeRates(roundId);
    const known = [own, ...rates.map((rate) => rate.currency)];
    return known.includes(currency) && isKnownCurrency(currency)
      ? null
      : new UnknownCurrency(currency, known);
  }

  /** The candidate's lock keeps others from entering the same number at the same time. */
  private async numberProblem(em: EntityManager, quote: Quote, { vendorName, number }: QuoteFieldsInput) {
    const vendor = await this.vendors.findByName(em, vendorName);
    if (!vendor) return null;
    const others = {
      candidateId: quote.candidateId,
      vendorId: vendor.id,
      number,
      ...(quote.id && { id: Not(quote.id) }),
    };
    return (await em.existsBy(Quote, others)) ? new QuoteNumberTaken(number, vendor.name) : null;
  }
}

function columnsOf(fields: QuoteFieldsInput) {
  const { number, quoteDate, validUntil, currency, pricesIncludeVat, quantity, warrantyYears } = fields;
  const { serviceTier, leadWeeks, incoterm, namedPlace, paymentTerms } = fields;
  return {
    ...{ number, quoteDate, validUntil, currency, pricesIncludeVat, quantity, warrantyYears },
    ...{ serviceTier, leadWeeks, incoterm, namedPlace, paymentTerms },
  };
}
