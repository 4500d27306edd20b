import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { groupByKey } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Link } from './entities/link.entity.js';
import { LinkMember } from './entities/link-member.entity.js';

export interface LinkWithMembers {
  link: Link;
  memberIds: string[];
}

@Injectable()
export class LinksService {
  constructor(private readonly db: TenantDatabase) {}

  /** Every link of the round with the ids of its members, in an order that does not change. */
  ofRound(roundId: string): Promise<LinkWithMembers[]> {
    return this.db.transaction(async (em) => {
      const links = await em.find(Link, { where: { roundId }, order: { kind: 'ASC', id: 'ASC' } });
      const ids = links.map(({ id }) => id);
      const members = await em.find(LinkMember, {
        where: { linkId: In(ids) },
        order: { candidateId: 'ASC' },
      });
      const membersOf = groupByKey(ids, members, ({ linkId }) => linkId);
      return links.map((link, i) => ({
        link,
        memberIds: membersOf[i].map(({ candidateId }) => candidateId),
      }));
    });
  }
}
