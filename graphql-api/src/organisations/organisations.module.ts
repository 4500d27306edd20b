import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Department } from './entities/department.entity.js';
import { Organisation } from './entities/organisation.entity.js';
import { Site } from './entities/site.entity.js';
import { OrganisationsResolver } from './organisations.resolver.js';
import { OrganisationsService } from './organisations.service.js';
import { OwnCurrencyLoader } from './own-currency.loader.js';
import { DepartmentsByIdLoader, SitesByIdLoader } from './places-by-id.loader.js';

@Module({
  imports: [TypeOrmModule.forFeature([Organisation, Site, Department])],
  providers: [
    OrganisationsService,
    OrganisationsResolver,
    OwnCurrencyLoader,
    SitesByIdLoader,
    DepartmentsByIdLoader,
  ],
  exports: [OrganisationsService, OwnCurrencyLoader, SitesByIdLoader, DepartmentsByIdLoader],
})
export class OrganisationsModule {}
