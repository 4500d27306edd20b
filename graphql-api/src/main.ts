import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { setUpApp } from './app-setup.js';
import { AppModule } from './app.module.js';
import { ENV, type Env } from './config/env.js';

const app = await NestFactory.create<NestExpressApplication>(AppModule, {
  bodyParser: false,
  logger: ['error', 'warn'],
});
setUpApp(app);
const env = app.get<Env>(ENV);
const server = app.getHttpServer();
server.headersTimeout = 10_000;
server.requestTimeout = 30_000;
await app.listen(env.port, '127.0.0.1');
console.log(`listening on ${env.publicUrl}`);
