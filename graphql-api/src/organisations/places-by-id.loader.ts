import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { inOrderOf, RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Department } from './entities/department.entity.js';
import { Site } from './entities/site.entity.js';

@Injectable()
export class SitesByIdLoader extends RequestLoader<string, Site> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(ids: readonly string[]) {
    const rows = await this.db.transaction((em) => em.findBy(Site, { id: In([...ids]) }));
    return inOrderOf(ids, rows, 'site');
  }
}

@Injectable()
export class DepartmentsByIdLoader extends RequestLoader<string, Department> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(ids: readonly string[]) {
    const rows = await this.db.transaction((em) => em.findBy(Department, { id: In([...ids]) }));
    return inOrderOf(ids, rows, 'department');
  }
}
