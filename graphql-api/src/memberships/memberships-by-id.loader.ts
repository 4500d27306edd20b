import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { NotFoundError } from '../common/domain-error.js';
import { RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Membership } from './entities/membership.entity.js';

@Injectable()
export class MembershipsByIdLoader extends RequestLoader<string, Membership> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(ids: readonly string[]) {
    const rows = await this.db.transaction((em) => em.findBy(Membership, { id: In([...ids]) }));
    return ids.map((id) => rows.find((row) => row.id === id) ?? new NotFoundError('membership', id));
  }
}
