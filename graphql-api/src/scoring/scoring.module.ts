import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { CandidateBenefits } from '../candidates/candidate-benefits.js';
import { MembershipsModule } from '../memberships/memberships.module.js';
import { RoundsModule } from '../rounds/rounds.module.js';
import { BenefitByCandidateLoader } from './benefit-by-candidate.loader.js';
import { BenefitsService } from './benefits.service.js';
import { CandidateBenefitResolver } from './candidate-benefit.resolver.js';
import { CriteriaResolver } from './criteria.resolver.js';
import { CriteriaService } from './criteria.service.js';
import { Criterion } from './entities/criterion.entity.js';
import { Score } from './entities/score.entity.js';
import { KnownBenefits } from './known-benefits.js';
import { RoundCriteriaResolver } from './round-criteria.resolver.js';
import { ScoresResolver } from './scores.resolver.js';
import { ScoresService } from './scores.service.js';
import { ScoringReadiness } from './scoring-readiness.js';
import { WeightByCriterionLoader } from './weight-by-criterion.loader.js';

@Module({
  imports: [TypeOrmModule.forFeature([Criterion, Score]), AuditModule, MembershipsModule, RoundsModule],
  providers: [
    CriteriaService,
    CriteriaResolver,
    RoundCriteriaResolver,
    WeightByCriterionLoader,
    ScoresService,
    ScoresResolver,
    BenefitsService,
    BenefitByCandidateLoader,
    CandidateBenefitResolver,
    ScoringReadiness,
    KnownBenefits,
    { provide: CandidateBenefits, useExisting: KnownBenefits },
  ],
  exports: [CriteriaService, ScoresService, BenefitsService, KnownBenefits, CandidateBenefits],
})
export class ScoringModule {}
