import { Injectable } from '@nestjs/common';
import { currentCaller } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Department } from './entities/department.entity.js';
import { Organisation } from './entities/organisation.entity.js';
import { Site } from './entities/site.entity.js';

@Injectable()
export class OrganisationsService {
  constructor(private readonly db: TenantDatabase) {}

  /** The caller's own organisation: the only one the database shows. */
  current(): Promise<Organisation> {
    return this.db.transaction((em) =>
      em.findOneByOrFail(Organisation, { id: currentCaller().organisationId }),
    );
  }

  sites(): Promise<Site[]> {
    return this.db.transaction((em) => em.find(Site, { order: { name: 'ASC' } }));
  }

  departments(): Promise<Department[]> {
    return this.db.transaction((em) => em.find(Department, { order: { name: 'ASC' } }));
  }
}
