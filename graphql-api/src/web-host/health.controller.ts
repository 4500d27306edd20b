import { Controller, Get } from '@nestjs/common';
import { DataSource } from 'typeorm';

@Controller()
export class HealthController {
  constructor(private readonly dataSource: DataSource) {}

  /** The process answers. Does not touch the database. */
  @Get('live')
  live() {
    return { live: true };
  }

  /** The process can serve: the database answers. */
  @Get('ready')
  async ready() {
    await this.dataSource.query('select 1');
    return { ready: true };
  }
}
