import { Module } from '@nestjs/common';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { QuotesModule } from '../quotes/quotes.module.js';
import { CandidateQuoteInForceResolver } from './candidate-quote-in-force.resolver.js';
import { CostingService } from './costing.service.js';
import { CostsByCandidateLoader } from './costs-by-candidate.loader.js';
import { QuoteCostsResolver } from './quote-costs.resolver.js';
import { RoundCostsService } from './round-costs.service.js';

@Module({
  imports: [OrganisationsModule, QuotesModule],
  providers: [
    CostingService,
    RoundCostsService,
    CostsByCandidateLoader,
    QuoteCostsResolver,
    CandidateQuoteInForceResolver,
  ],
  exports: [CostingService, RoundCostsService],
})
export class CostingModule {}
