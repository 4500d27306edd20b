import 'reflect-metadata';
import { constants, setPriority } from 'node:os';
import { NestFactory } from '@nestjs/core';
import { WorkerModule } from './worker.module.js';

// searches take what the API and the database leave; threads started later inherit it
setPriority(constants.priority.PRIORITY_LOW);

const worker = await NestFactory.createApplicationContext(WorkerModule, { logger: ['error', 'warn'] });
worker.enableShutdownHooks();
console.log('worker ready');
