import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import { WorkerModule } from './worker.module.js';

const worker = await NestFactory.createApplicationContext(WorkerModule, { logger: ['error', 'warn'] });
worker.enableShutdownHooks();
console.log('worker ready');
