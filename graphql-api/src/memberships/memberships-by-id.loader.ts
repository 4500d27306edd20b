import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { inOrderOf, RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Membership } from './entities/membership.entity.js';

@Injectable()
export class MembershipsByIdLoader extends RequestLoader<string, Membership> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(ids: readonly string[]) {
    const rows = await this.db.transaction((em) => em.findBy(Membership, { id: In([...ids]) }));
    return inOrderOf(ids, rows, 'membership');
  }
}
