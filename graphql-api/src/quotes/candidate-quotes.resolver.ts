import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { Quote } from './entities/quote.entity.js';
import { QuotesByCandidateLoader } from './quotes.loaders.js';

@Resolver(() => Candidate)
export class CandidateQuotesResolver {
  constructor(private readonly quotesByCandidate: QuotesByCandidateLoader) {}

  @ResolveField(() => [Quote], { description: 'By number.' })
  quotes(@Parent() { id }: Candidate) {
    return this.quotesByCandidate.load(id);
  }
}
