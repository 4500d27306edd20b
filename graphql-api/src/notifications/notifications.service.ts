import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { JobsService } from '../jobs/jobs.service.js';
import { Membership } from '../memberships/entities/membership.entity.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Letter } from './entities/letter.entity.js';
import type { Message } from './messages/message.js';

export interface LetterToSend {
  id: string;
  subject: string;
  body: string;
  to: { name: string; address: string };
}

@Injectable()
export class NotificationsService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly jobs: JobsService,
  ) {}

  /** Writes one letter a member within the transaction of the change it tells of. */
  async write(
    em: EntityManager,
    membershipIds: readonly string[],
    { subject, body }: Message,
  ): Promise<void> {
    for (const membershipId of membershipIds) {
      const letter = await em.save(em.create(Letter, { membershipId, subject, body, state: 'WAITING' }));
      await this.jobs.enqueue(em, 'letter.send', { letterId: letter.id });
    }
  }

  /** The letter with its address, unless it has gone out already. */
  waiting(letterId: string): Promise<LetterToSend | undefined> {
    return this.db.transaction(async (em) => {
      const letter = await em.findOneBy(Letter, { id: letterId, state: 'WAITING' });
      if (!letter) return undefined;
      const { name, email } = await em.findOneByOrFail(Membership, { id: letter.membershipId });
      return { id: letter.id, subject: letter.subject, body: letter.body, to: { name, address: email } };
    });
  }

  markSent(letterId: string): Promise<void> {
    return this.db.transaction(async (em) => {
      await em.update(Letter, { id: letterId }, { state: 'SENT', sentAt: new Date() });
    });
  }
}
