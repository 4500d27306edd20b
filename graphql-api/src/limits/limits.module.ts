import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { CostingModule } from '../costing/costing.module.js';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { RoundsModule } from '../rounds/rounds.module.js';
import { AskedByLimitLoader } from './asked-by-limit.loader.js';
import { Limit } from './entities/limit.entity.js';
import { LimitsResolver } from './limits.resolver.js';
import { LimitsService } from './limits.service.js';
import { RoundLimitsResolver } from './round-limits.resolver.js';

@Module({
  imports: [TypeOrmModule.forFeature([Limit]), AuditModule, CostingModule, OrganisationsModule, RoundsModule],
  providers: [LimitsService, LimitsResolver, RoundLimitsResolver, AskedByLimitLoader],
  exports: [LimitsService],
})
export class LimitsModule {}
