import { Inject, Injectable } from '@nestjs/common';
import { ENV, type Env } from '../config/env.js';

/** Addresses of pages, for letters. They hold no secret and do nothing by being opened. */
@Injectable()
export class PageLinks {
  constructor(@Inject(ENV) private readonly env: Env) {}

  approval(roundId: string): string {
    return `${this.env.publicUrl}/rounds/${roundId}/approval`;
  }
}
