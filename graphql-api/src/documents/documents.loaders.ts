import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { groupByKey, RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Document, DocumentState } from './entities/document.entity.js';

/** Oldest first; those still expected are not shown. */
@Injectable()
export class DocumentsByCandidateLoader extends RequestLoader<string, Document[]> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(candidateIds: readonly string[]) {
    const rows = await this.db.transaction((em) =>
      em.find(Document, {
        where: { candidateId: In([...candidateIds]), state: DocumentState.READY },
        order: { createdAt: 'ASC', id: 'ASC' },
      }),
    );
    return groupByKey(candidateIds, rows, ({ candidateId }) => candidateId);
  }
}

@Injectable()
export class DocumentsByQuoteLoader extends RequestLoader<string, Document[]> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(quoteIds: readonly string[]) {
    const rows = await this.db.transaction((em) =>
      em.find(Document, {
        where: { quoteId: In([...quoteIds]), state: DocumentState.READY },
        order: { createdAt: 'ASC', id: 'ASC' },
      }),
    );
    return groupByKey<string, Document>(quoteIds, rows, ({ quoteId }) => quoteId ?? '');
  }
}
