import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { Quote } from '../quotes/entities/quote.entity.js';
import { QuoteInForceReason } from '../quotes/quote-in-force.js';
import { CostsByCandidateLoader } from './costs-by-candidate.loader.js';

@Resolver(() => Candidate)
export class CandidateQuoteInForceResolver {
  constructor(private readonly costsByCandidate: CostsByCandidateLoader) {}

  @ResolveField(() => Quote, {
    nullable: true,
    description: 'By which the candidate counts. Empty without a usable quote.',
  })
  async quoteInForce(@Parent() { id }: Candidate) {
    return (await this.costsByCandidate.load(id)).inForce?.judged.quote;
  }

  @ResolveField(() => QuoteInForceReason, { nullable: true })
  async quoteInForceReason(@Parent() { id }: Candidate) {
    return (await this.costsByCandidate.load(id)).inForce?.reason;
  }
}
