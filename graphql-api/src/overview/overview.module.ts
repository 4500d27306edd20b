import { Module } from '@nestjs/common';
import { CandidatesModule } from '../candidates/candidates.module.js';
import { CostingModule } from '../costing/costing.module.js';
import { MembershipsModule } from '../memberships/memberships.module.js';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { ScoringModule } from '../scoring/scoring.module.js';
import { OverviewResolver } from './overview.resolver.js';
import { OverviewService } from './overview.service.js';

/** Where a round stands, drawn from several features. */
@Module({
  imports: [CandidatesModule, CostingModule, MembershipsModule, OrganisationsModule, ScoringModule],
  providers: [OverviewService, OverviewResolver],
})
export class OverviewModule {}
