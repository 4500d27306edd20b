import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Department } from './entities/department.entity.js';
import { Organisation } from './entities/organisation.entity.js';
import { Site } from './entities/site.entity.js';
import { OrganisationsResolver } from './organisations.resolver.js';
import { OrganisationsService } from './organisations.service.js';
import { DepartmentsByIdLoader, SitesByIdLoader } from './places-by-id.loader.js';

@Module({
  imports: [TypeOrmModule.forFeature([Organisation, Site, Department])],
  providers: [OrganisationsService, OrganisationsResolver, SitesByIdLoader, DepartmentsByIdLoader],
  exports: [OrganisationsService, SitesByIdLoader, DepartmentsByIdLoader],
})
export class OrganisationsModule {}
