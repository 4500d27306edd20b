import { Args, ID, Int, Query, Resolver } from '@nestjs/graphql';
import { NotFoundError } from '../common/domain-error.js';
import { isUuid } from '../tenancy/find-or-throw.js';
import { AuditService } from './audit.service.js';
import { AuditFeed, AuditVerification } from './models/audit-entry.model.js';

@Resolver()
export class AuditResolver {
  constructor(private readonly audit: AuditService) {}

  @Query(() => AuditFeed)
  auditFeed(
    @Args('roundId', { type: () => ID, nullable: true }) roundId: string | undefined,
    @Args('first', { type: () => Int, defaultValue: 20 }) first: number,
    @Args('after', { nullable: true, type: () => String }) after: string | undefined,
  ) {
    if (roundId && !isUuid(roundId)) throw new NotFoundError('round', roundId);
    return this.audit.feed(roundId ?? undefined, first, after ?? undefined);
  }

  @Query(() => AuditVerification)
  auditVerify() {
    return this.audit.verify();
  }
}
