import { DiscoveryService } from '@nestjs/core';
import type { JobPayloads, JobTask } from './jobs.service.js';

/** Marks a provider as the handler of a task. Handlers may run twice and must not mind. */
export const JobHandler = DiscoveryService.createDecorator<JobTask>();

export interface HandlesJob<T extends JobTask> {
  run(payload: JobPayloads[T]): Promise<void>;
}
