import { Worker } from 'node:worker_threads';
import { Injectable, type OnApplicationBootstrap, type OnApplicationShutdown } from '@nestjs/common';
import type { SearchOrder } from './run-result.js';
import { SearchHost } from './search-host.js';

/**
 * Threads for searches. One is always kept ready: a fresh thread runs its first search several times slower than the
 * next, because nothing of it is compiled yet, and a person is waiting for the first.
 */
@Injectable()
export class SearchThreads implements OnApplicationBootstrap, OnApplicationShutdown {
  private spare: Worker | undefined;
  private closing = false;

  onApplicationBootstrap() {
    this.prepare();
  }

  async onApplicationShutdown() {
    this.closing = true;
    await this.spare?.terminate();
  }

  begin(order: Omit<SearchOrder, 'stop'>): SearchHost {
    const thread = this.spare ?? newThread();
    this.spare = undefined;
    thread.ref();
    thread.once('exit', () => this.prepare());
    return new SearchHost(thread, order);
  }

  private prepare() {
    if (this.spare || this.closing) return;
    const thread = newThread();
    // it waits for nothing but an order: that alone is no reason for the process to stay
    thread.unref();
    thread.once('error', () => {
      if (this.spare === thread) this.spare = undefined;
    });
    this.spare = thread;
  }
}

function newThread(): Worker {
  return new Worker(new URL('./search-thread.js', import.meta.url));
}
