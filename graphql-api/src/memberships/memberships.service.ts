import { Injectable } from '@nestjs/common';
import { SessionsService } from '../auth/sessions.service.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import { currentCaller, currentMembershipId } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Membership } from './entities/membership.entity.js';
import type { Viewer } from './models/viewer.model.js';
import type { Role } from './role.enum.js';

@Injectable()
export class MembershipsService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly organisations: OrganisationsService,
    private readonly sessions: SessionsService,
  ) {}

  /** The organisations are asked for first, over a connection of their own: within a transaction none is waited for. */
  async viewer(): Promise<Viewer> {
    const memberships = await this.sessions.membershipsOf(currentCaller().userId ?? '');
    return this.db.transaction(async (em) => {
      const membership = await em.findOneByOrFail(Membership, { id: currentMembershipId() });
      return {
        membership,
        email: membership.email,
        organisation: await this.organisations.current(),
        memberships,
      };
    });
  }

  /** Active members holding the role, by name. */
  withRole(role: Role): Promise<Membership[]> {
    return this.db.transaction((em) =>
      em
        .createQueryBuilder(Membership, 'membership')
        .where(':role = any(membership.roles) and membership.active', { role })
        .orderBy('membership.name')
        .getMany(),
    );
  }
}
