import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { groupByKey, RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Candidate } from './entities/candidate.entity.js';
import { Link } from './entities/link.entity.js';
import { LinkMember } from './entities/link-member.entity.js';

@Injectable()
export class LinksByRoundLoader extends RequestLoader<string, Link[]> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(roundIds: readonly string[]) {
    const links = await this.db.transaction((em) =>
      em.find(Link, { where: { roundId: In([...roundIds]) }, order: { kind: 'ASC', id: 'ASC' } }),
    );
    return groupByKey(roundIds, links, ({ roundId }) => roundId);
  }
}

/** The links that bind a candidate, whether it needs others or is one of the members. */
@Injectable()
export class LinksByCandidateLoader extends RequestLoader<string, Link[]> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected batch(candidateIds: readonly string[]) {
    return this.db.transaction(async (em) => {
      const memberships = await em.findBy(LinkMember, { candidateId: In([...candidateIds]) });
      const links = await em.find(Link, {
        where: [{ id: In(memberships.map(({ linkId }) => linkId)) }, { candidateId: In([...candidateIds]) }],
        order: { kind: 'ASC', id: 'ASC' },
      });
      return candidateIds.map((id) => {
        const memberOf = new Set(
          memberships.filter(({ candidateId }) => candidateId === id).map(({ linkId }) => linkId),
        );
        return links.filter((link) => link.candidateId === id || memberOf.has(link.id));
      });
    });
  }
}

@Injectable()
export class MembersByLinkLoader extends RequestLoader<string, Candidate[]> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected batch(linkIds: readonly string[]) {
    return this.db.transaction(async (em) => {
      const members = await em.findBy(LinkMember, { linkId: In([...linkIds]) });
      const ids = members.map(({ candidateId }) => candidateId);
      const candidates = await em.find(Candidate, { where: { id: In(ids) }, order: { code: 'ASC' } });
      return linkIds.map((linkId) => {
        const own = new Set(
          members.filter((member) => member.linkId === linkId).map(({ candidateId }) => candidateId),
        );
        return candidates.filter(({ id }) => own.has(id));
      });
    });
  }
}
