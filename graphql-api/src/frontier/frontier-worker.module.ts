import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { Run } from './entities/run.entity.js';
import { FrontierJob } from './frontier.job.js';
import { RunLeasesService } from './run-leases.service.js';
import { RunSweepService } from './run-sweep.service.js';

/** What the worker process needs of the frontier: it searches frozen problems and builds none. */
@Module({
  imports: [TypeOrmModule.forFeature([Run]), AuditModule],
  providers: [FrontierJob, RunLeasesService, RunSweepService],
})
export class FrontierWorkerModule {}
