import { Module } from '@nestjs/common';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { CostingService } from './costing.service.js';
import { RoundCostsService } from './round-costs.service.js';

@Module({
  imports: [OrganisationsModule],
  providers: [CostingService, RoundCostsService],
  exports: [CostingService, RoundCostsService],
})
export class CostingModule {}
