import 'reflect-metadata';
import { readdirSync } from 'node:fs';
import { constants, setPriority } from 'node:os';
import { NestFactory } from '@nestjs/core';
import { WorkerModule } from './worker.module.js';

yieldToOthers();

const worker = await NestFactory.createApplicationContext(WorkerModule, { logger: ['error', 'warn'] });
worker.enableShutdownHooks();
console.log('worker ready');

/** Searches take what the API and the database leave. Threads that are started later inherit it. */
function yieldToOthers() {
  // Linux has priorities by thread, and some, such as those that collect garbage, are there already
  const threads = process.platform === 'linux' ? readdirSync('/proc/self/task').map(Number) : [0];
  for (const thread of threads) setPriority(thread, constants.priority.PRIORITY_LOW);
}
