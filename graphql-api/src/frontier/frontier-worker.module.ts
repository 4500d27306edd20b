import { Module, type DynamicModule } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { Run } from './entities/run.entity.js';
import { FrontierTaskJob } from './frontier-task.job.js';
import { FrontierJob } from './frontier.job.js';
import { RunLeasesService } from './run-leases.service.js';
import { RunSweepService } from './run-sweep.service.js';
import { RunTasksService } from './run-tasks.service.js';
import { SEARCH_THREADS } from './search-settings.js';
import { SearchThreads } from './search-threads.js';

/** What the worker process needs of the frontier: it searches frozen problems and builds none. */
@Module({
  imports: [TypeOrmModule.forFeature([Run]), AuditModule],
  providers: [
    FrontierJob,
    FrontierTaskJob,
    RunLeasesService,
    RunSweepService,
    RunTasksService,
    SearchThreads,
  ],
})
export class FrontierWorkerModule {
  /** @param threads of this process that work on one run */
  static onThreads(threads: number): DynamicModule {
    return {
      module: FrontierWorkerModule,
      providers: [{ provide: SEARCH_THREADS, useValue: threads }],
    };
  }
}
