import { Global, Module } from '@nestjs/common';
import { JobsService } from './jobs.service.js';
import { PassedOver } from './passed-over.js';

@Global()
@Module({ providers: [JobsService, PassedOver], exports: [JobsService, PassedOver] })
export class JobsModule {}
