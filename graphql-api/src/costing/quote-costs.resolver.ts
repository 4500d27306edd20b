import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { NotFoundError } from '../common/domain-error.js';
import { Quote } from '../quotes/entities/quote.entity.js';
import { QuoteFault } from '../quotes/quote-fault.enum.js';
import { CostsByCandidateLoader } from './costs-by-candidate.loader.js';
import { QuoteCostModel, toQuoteCostModel } from './models/quote-cost.model.js';

@Resolver(() => Quote)
export class QuoteCostsResolver {
  constructor(private readonly costsByCandidate: CostsByCandidateLoader) {}

  @ResolveField(() => QuoteCostModel)
  async cost(@Parent() quote: Quote) {
    return toQuoteCostModel((await this.judged(quote)).cost);
  }

  @ResolveField(() => [QuoteFault], { description: 'None: the quote can be bought by on the decision date.' })
  async faults(@Parent() quote: Quote) {
    return (await this.judged(quote)).faults;
  }

  @ResolveField(() => Boolean, { description: 'Whether the candidate counts by this quote.' })
  async inForce(@Parent() quote: Quote) {
    const { inForce } = await this.costsByCandidate.load(quote.candidateId);
    return inForce?.judged.quote.id === quote.id;
  }

  private async judged({ id, candidateId }: Quote) {
    const { quotes } = await this.costsByCandidate.load(candidateId);
    const found = quotes.find(({ quote }) => quote.id === id);
    if (!found) throw new NotFoundError('quote', id);
    return found;
  }
}
