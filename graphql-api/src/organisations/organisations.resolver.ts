import { ResolveField, Resolver } from '@nestjs/graphql';
import { Department } from './entities/department.entity.js';
import { Organisation } from './entities/organisation.entity.js';
import { Site } from './entities/site.entity.js';
import { OrganisationsService } from './organisations.service.js';

@Resolver(() => Organisation)
export class OrganisationsResolver {
  constructor(private readonly organisations: OrganisationsService) {}

  @ResolveField(() => [Site])
  sites() {
    return this.organisations.sites();
  }

  @ResolveField(() => [Department])
  departments() {
    return this.organisations.departments();
  }
}
