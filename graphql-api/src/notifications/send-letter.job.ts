import { Injectable } from '@nestjs/common';
import { JobHandler, type HandlesJob } from '../jobs/job-handler.decorator.js';
import { MailService } from '../mail/mail.service.js';
import { NotificationsService } from './notifications.service.js';

/** At least once: a worker that dies between sending and marking sends again, with the same message id. */
@JobHandler('letter.send')
@Injectable()
export class SendLetterJob implements HandlesJob<'letter.send'> {
  constructor(
    private readonly notifications: NotificationsService,
    private readonly mail: MailService,
  ) {}

  async run({ letterId }: { letterId: string }) {
    const letter = await this.notifications.waiting(letterId);
    if (!letter) return;
    await this.mail.send({ id: letter.id, to: letter.to, subject: letter.subject, text: letter.body });
    await this.notifications.markSent(letterId);
  }
}
