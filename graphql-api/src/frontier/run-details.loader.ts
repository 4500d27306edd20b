import { Injectable } from '@nestjs/common';
import { In } from 'typeorm';
import { inOrderOf, RequestLoader } from '../common/request-loader.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Run } from './entities/run.entity.js';

export type RunDetails = Pick<Run, 'id' | 'items' | 'progress' | 'result'>;

/** The large columns of runs, for the fields that show them. */
@Injectable()
export class RunDetailsLoader extends RequestLoader<string, RunDetails> {
  constructor(private readonly db: TenantDatabase) {
    super();
  }

  protected async batch(ids: readonly string[]) {
    const rows: RunDetails[] = await this.db.transaction((em) =>
      em.find(Run, {
        where: { id: In([...ids]) },
        select: { id: true, items: true, progress: true, result: true },
      }),
    );
    return inOrderOf(ids, rows, 'run');
  }
}
