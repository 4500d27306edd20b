import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuthModule } from '../auth/auth.module.js';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { AuditEntryMemberResolver } from './audit-entry-member.resolver.js';
import { Membership } from './entities/membership.entity.js';
import { MembershipsByIdLoader } from './memberships-by-id.loader.js';
import { MembershipsResolver } from './memberships.resolver.js';
import { MembershipsService } from './memberships.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Membership]), AuthModule, OrganisationsModule],
  providers: [MembershipsService, MembershipsResolver, MembershipsByIdLoader, AuditEntryMemberResolver],
  exports: [MembershipsService, MembershipsByIdLoader],
})
export class MembershipsModule {}
