import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { inOrderOf, RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Candidate } from './entities/candidate.entity.js';

@Injectable()
export class CandidatesByIdLoader extends RequestLoader<string, Candidate> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(ids: readonly string[]) {
    const rows = await this.db.transaction((em) => em.findBy(Candidate, { id: In([...ids]) }));
    return inOrderOf(ids, rows, 'candidate');
  }
}
