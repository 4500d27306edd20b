import { availableParallelism } from 'node:os';
import { required } from './env.js';

/** What the worker process needs beside the rest. */
export interface WorkerEnv {
  databaseWorkerUrl: string;
  concurrency: number;
  /** Threads that work on one run. */
  searchThreads: number;
}

export const WORKER_ENV = Symbol('WORKER_ENV');

export function readWorkerEnv(source: NodeJS.ProcessEnv = process.env): WorkerEnv {
  return {
    databaseWorkerUrl: required(source, 'DATABASE_WORKER_URL'),
    concurrency: Number(source.WORKER_CONCURRENCY ?? 3),
    searchThreads: Number(source.SEARCH_THREADS ?? Math.min(4, availableParallelism())),
  };
}
