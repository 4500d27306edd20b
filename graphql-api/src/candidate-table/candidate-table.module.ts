import { Module } from '@nestjs/common';
import { CostingModule } from '../costing/costing.module.js';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { ScoringModule } from '../scoring/scoring.module.js';
import { CandidateTableResolver } from './candidate-table.resolver.js';
import { CandidateTableService } from './candidate-table.service.js';

@Module({
  imports: [CostingModule, OrganisationsModule, ScoringModule],
  providers: [CandidateTableService, CandidateTableResolver],
})
export class CandidateTableModule {}
