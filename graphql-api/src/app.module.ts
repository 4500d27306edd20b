import { Module } from '@nestjs/common';
import { AuditModule } from './audit/audit.module.js';
import { AuthModule } from './auth/auth.module.js';
import { CandidateTableModule } from './candidate-table/candidate-table.module.js';
import { CandidatesModule } from './candidates/candidates.module.js';
import { CalendarDateScalar } from './common/scalars/calendar-date.scalar.js';
import { DateTimeScalar } from './common/scalars/date-time.scalar.js';
import { DecimalScalar } from './common/scalars/decimal.scalar.js';
import { ConfigModule } from './config/config.module.js';
import { CostingModule } from './costing/costing.module.js';
import { DatabaseModule } from './database/database.module.js';
import { DocumentsModule } from './documents/documents.module.js';
import { FrontierModule } from './frontier/frontier.module.js';
import { GraphqlModule } from './graphql.module.js';
import { JobsModule } from './jobs/jobs.module.js';
import { LimitsModule } from './limits/limits.module.js';
import { MembershipsModule } from './memberships/memberships.module.js';
import { OrganisationsModule } from './organisations/organisations.module.js';
import { OverviewModule } from './overview/overview.module.js';
import { QuotesModule } from './quotes/quotes.module.js';
import { RoundsModule } from './rounds/rounds.module.js';
import { ScoringModule } from './scoring/scoring.module.js';
import { SelectionsModule } from './selections/selections.module.js';
import { TenancyModule } from './tenancy/tenancy.module.js';
import { HealthController } from './web-host/health.controller.js';

@Module({
  imports: [
    ConfigModule,
    DatabaseModule,
    TenancyModule,
    JobsModule,
    GraphqlModule,
    AuditModule,
    AuthModule,
    OrganisationsModule,
    MembershipsModule,
    RoundsModule,
    CandidatesModule,
    DocumentsModule,
    QuotesModule,
    CostingModule,
    CandidateTableModule,
    LimitsModule,
    ScoringModule,
    OverviewModule,
    FrontierModule,
    SelectionsModule,
  ],
  providers: [DecimalScalar, CalendarDateScalar, DateTimeScalar],
  controllers: [HealthController],
})
export class AppModule {}
