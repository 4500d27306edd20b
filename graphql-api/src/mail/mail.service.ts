import { Inject, Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
import { ENV, type Env } from '../config/env.js';

export interface OutgoingMail {
  /** Stable over repeated sending, so that a double can be recognised. */
  id: string;
  to: { name: string; address: string };
  subject: string;
  text: string;
}

@Injectable()
export class MailService implements OnApplicationShutdown {
  private readonly transport: Transporter;

  constructor(@Inject(ENV) private readonly env: Env) {
    this.transport = createTransport({
      host: env.smtp.host,
      port: env.smtp.port,
      ignoreTLS: !env.production,
      connectionTimeout: 15_000,
      socketTimeout: 15_000,
    });
  }

  async send({ id, to, subject, text }: OutgoingMail): Promise<void> {
    await this.transport.sendMail({
      from: this.env.smtp.from,
      to,
      subject,
      text,
      messageId: `<${id}@metewand.example>`,
    });
  }

  onApplicationShutdown() {
    this.transport.close();
  }
}
