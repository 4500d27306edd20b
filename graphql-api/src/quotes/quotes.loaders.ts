import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { groupByKey, inOrderOf, RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Quote } from './entities/quote.entity.js';
import { Vendor } from './entities/vendor.entity.js';

/** By number. */
@Injectable()
export class QuotesByCandidateLoader extends RequestLoader<string, Quote[]> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(candidateIds: readonly string[]) {
    const rows = await this.db.transaction((em) =>
      em.find(Quote, { where: { candidateId: In([...candidateIds]) }, order: { number: 'ASC', id: 'ASC' } }),
    );
    return groupByKey(candidateIds, rows, ({ candidateId }) => candidateId);
  }
}

@Injectable()
export class VendorsByIdLoader extends RequestLoader<string, Vendor> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(ids: readonly string[]) {
    const rows = await this.db.transaction((em) => em.findBy(Vendor, { id: In([...ids]) }));
    return inOrderOf(ids, rows, 'vendor');
  }
}
