import 'reflect-metadata';
import { runMigrations } from 'graphile-worker';
import { required } from './config/env.js';
import { ownerDataSource } from './database/data-source.js';

/** Brings the queue's schema and ours up to date. The queue comes first: our functions call it. */
await runMigrations({ connectionString: required(process.env, 'DATABASE_WORKER_URL') });

const owner = ownerDataSource(required(process.env, 'DATABASE_OWNER_URL'));
await owner.initialize();
await owner.query('create schema if not exists metewand');
const applied = await owner.runMigrations();
await owner.destroy();
console.log(applied.length ? `${applied.length} migrations applied` : 'the database is up to date');
