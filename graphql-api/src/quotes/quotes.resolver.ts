import { Args, ID, Mutation, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { CandidatesByIdLoader } from '../candidates/candidates-by-id.loader.js';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { Document } from '../documents/entities/document.entity.js';
import { DocumentsByQuoteLoader } from '../documents/documents.loaders.js';
import { KeepQuoteInput, KeepQuoteResult } from './dto/keep-quote.input.js';
import { QuotePageArgs } from './dto/quote-page.args.js';
import { CreateQuoteInput, UpdateQuoteInput } from './dto/save-quote.input.js';
import { SaveQuoteResult } from './dto/save-quote.result.js';
import { Quote } from './entities/quote.entity.js';
import { Vendor } from './entities/vendor.entity.js';
import { KeptQuotesService } from './kept-quotes.service.js';
import { QuotePage } from './models/quote-page.model.js';
import { QuoteListService } from './quote-list.service.js';
import { VendorsByIdLoader } from './quotes.loaders.js';
import { QuotesService } from './quotes.service.js';
import { VendorsService } from './vendors.service.js';

@Resolver(() => Quote)
export class QuotesResolver {
  constructor(
    private readonly quotesService: QuotesService,
    private readonly list: QuoteListService,
    private readonly keptQuotes: KeptQuotesService,
    private readonly vendorsService: VendorsService,
    private readonly candidatesById: CandidatesByIdLoader,
    private readonly vendorsById: VendorsByIdLoader,
    private readonly documentsByQuote: DocumentsByQuoteLoader,
  ) {}

  @Query(() => QuotePage)
  quotes(@Args() args: QuotePageArgs) {
    return this.list.page(args);
  }

  @Query(() => Quote)
  quote(@Args('id', { type: () => ID }) id: string) {
    return this.quotesService.find(id);
  }

  @Query(() => [Vendor], { description: 'By name.' })
  vendors() {
    return this.vendorsService.all();
  }

  @Mutation(() => SaveQuoteResult)
  createQuote(@Args('input') input: CreateQuoteInput) {
    return this.quotesService.create(input);
  }

  @Mutation(() => SaveQuoteResult)
  updateQuote(@Args('input') input: UpdateQuoteInput) {
    return this.quotesService.update(input);
  }

  @Mutation(() => KeepQuoteResult)
  keepQuote(@Args('input') input: KeepQuoteInput) {
    return this.keptQuotes.keep(input);
  }

  @ResolveField(() => Candidate)
  candidate(@Parent() { candidateId }: Quote) {
    return this.candidatesById.load(candidateId);
  }

  @ResolveField(() => Vendor)
  vendor(@Parent() { vendorId }: Quote) {
    return this.vendorsById.load(vendorId);
  }

  @ResolveField(() => [Document], { description: 'Oldest first.' })
  documents(@Parent() { id }: Quote) {
    return this.documentsByQuote.load(id);
  }
}
