import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { CandidatesModule } from '../candidates/candidates.module.js';
import { CostingModule } from '../costing/costing.module.js';
import { LimitsModule } from '../limits/limits.module.js';
import { MembershipsModule } from '../memberships/memberships.module.js';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { RoundsModule } from '../rounds/rounds.module.js';
import { ScoringModule } from '../scoring/scoring.module.js';
import { Run } from './entities/run.entity.js';
import { ProblemService } from './problem.service.js';
import { RoundRunsResolver } from './round-runs.resolver.js';
import { RunAlternativesService } from './run-alternatives.service.js';
import { RunDetailsLoader } from './run-details.loader.js';
import { RunsResolver } from './runs.resolver.js';
import { RunsService } from './runs.service.js';

@Module({
  imports: [
    TypeOrmModule.forFeature([Run]),
    AuditModule,
    CandidatesModule,
    CostingModule,
    LimitsModule,
    MembershipsModule,
    OrganisationsModule,
    RoundsModule,
    ScoringModule,
  ],
  providers: [
    RunsService,
    ProblemService,
    RunAlternativesService,
    RunsResolver,
    RoundRunsResolver,
    RunDetailsLoader,
  ],
  exports: [RunsService, ProblemService],
})
export class FrontierModule {}
