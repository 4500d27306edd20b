import { Module } from '@nestjs/common';
import { DiscoveryModule } from '@nestjs/core';
import { ConfigModule } from './config/config.module.js';
import { readWorkerEnv, WORKER_ENV } from './config/worker-env.js';
import { DatabaseModule } from './database/database.module.js';
import { FrontierWorkerModule } from './frontier/frontier-worker.module.js';
import { JobRunnerService } from './jobs/job-runner.service.js';
import { JobsModule } from './jobs/jobs.module.js';
import { MailModule } from './mail/mail.module.js';
import { NotificationsModule } from './notifications/notifications.module.js';
import { SendLetterJob } from './notifications/send-letter.job.js';
import { TenancyModule } from './tenancy/tenancy.module.js';

const env = readWorkerEnv();

/** The same features without the API. */
@Module({
  imports: [
    ConfigModule,
    DatabaseModule,
    TenancyModule,
    JobsModule,
    DiscoveryModule,
    MailModule,
    NotificationsModule,
    FrontierWorkerModule.onThreads(env.searchThreads),
  ],
  providers: [{ provide: WORKER_ENV, useValue: env }, JobRunnerService, SendLetterJob],
})
export class WorkerModule {}
