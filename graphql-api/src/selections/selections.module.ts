import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { FrontierModule } from '../frontier/frontier.module.js';
import { LimitsModule } from '../limits/limits.module.js';
import { MembershipsModule } from '../memberships/memberships.module.js';
import { NotificationsModule } from '../notifications/notifications.module.js';
import { RoundsModule } from '../rounds/rounds.module.js';
import { ScoringModule } from '../scoring/scoring.module.js';
import { Selection } from './entities/selection.entity.js';
import { RoundSelectionsResolver } from './round-selections.resolver.js';
import { SelectionsResolver } from './selections.resolver.js';
import { SelectionsService } from './selections.service.js';
import { SubmissionsService } from './submissions.service.js';

@Module({
  imports: [
    TypeOrmModule.forFeature([Selection]),
    AuditModule,
    FrontierModule,
    LimitsModule,
    MembershipsModule,
    NotificationsModule,
    RoundsModule,
    ScoringModule,
  ],
  providers: [SelectionsService, SubmissionsService, SelectionsResolver, RoundSelectionsResolver],
})
export class SelectionsModule {}
