import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { AuditEntry } from '../audit/models/audit-entry.model.js';
import { Membership } from './entities/membership.entity.js';
import { MembershipsByIdLoader } from './memberships-by-id.loader.js';

@Resolver(() => AuditEntry)
export class AuditEntryMemberResolver {
  constructor(private readonly membershipsById: MembershipsByIdLoader) {}

  @ResolveField(() => Membership, { nullable: true, description: 'Empty when the product itself acted.' })
  by(@Parent() { membershipId }: AuditEntry) {
    return membershipId && this.membershipsById.load(membershipId);
  }
}
