import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { NotFoundError } from '../common/domain-error.js';
import { RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { CostingService, type CostedCandidate } from './costing.service.js';

/** By candidate, because which of its quotes is in force takes all of them. */
@Injectable()
export class CostsByCandidateLoader extends RequestLoader<string, CostedCandidate> {
  constructor(
    private readonly db: TenantDatabase,
    private readonly costing: CostingService,
  ) {
    super();
  }

  protected batch(ids: readonly string[]) {
    return this.db.transaction(async (em) => {
      const candidates = await em.findBy(Candidate, { id: In([...ids]) });
      const costed = await this.costing.cost(em, candidates);
      const byId = new Map(costed.map((each) => [each.candidate.id, each]));
      return ids.map((id) => byId.get(id) ?? new NotFoundError('candidate', id));
    });
  }
}
