import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { ExchangeRate } from './entities/exchange-rate.entity.js';
import { Round } from './entities/round.entity.js';
import { RoundsResolver } from './rounds.resolver.js';
import { RoundsService } from './rounds.service.js';
import { ViewerRoundsResolver } from './viewer-rounds.resolver.js';

@Module({
  imports: [TypeOrmModule.forFeature([Round, ExchangeRate]), AuditModule, OrganisationsModule],
  providers: [RoundsService, RoundsResolver, ViewerRoundsResolver],
  exports: [RoundsService],
})
export class RoundsModule {}
