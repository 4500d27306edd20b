import { Injectable } from '@nestjs/common';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Criterion } from './entities/criterion.entity.js';

@Injectable()
export class CriteriaService {
  constructor(private readonly db: TenantDatabase) {}

  /** In the order of the sheet. */
  ofRound(roundId: string): Promise<Criterion[]> {
    return this.db.transaction((em) =>
      em.find(Criterion, { where: { roundId }, order: { position: 'ASC', name: 'ASC' } }),
    );
  }
}
