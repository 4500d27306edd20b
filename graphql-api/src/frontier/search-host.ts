import { AsyncResource } from 'node:async_hooks';
import { once } from 'node:events';
import { Worker } from 'node:worker_threads';
import type { RunProgressRow, RunResultRow, SearchMessage, SearchOrder } from './run-result.js';

/** A search in a thread of its own, so that the process goes on answering its database and its signals. */
export class SearchHost {
  private readonly stopFlag = new SharedArrayBuffer(Int32Array.BYTES_PER_ELEMENT);
  private readonly thread: Worker;

  constructor(order: Omit<SearchOrder, 'stop'>) {
    const workerData: SearchOrder = { ...order, stop: this.stopFlag };
    this.thread = new Worker(new URL('./search-thread.js', import.meta.url), { workerData });
  }

  /**
   * Resolves with the result, or with nothing once the thread was abandoned. Rejects when the thread breaks. Progress
   * is handed on as it comes, in the caller's context; the search does not wait for it.
   */
  async result(onProgress: (progress: RunProgressRow) => void): Promise<RunResultRow | undefined> {
    let result: RunResultRow | undefined;
    const inContext = AsyncResource.bind(onProgress);
    this.thread.on('message', (message: SearchMessage) => {
      if (message.kind === 'result') result = message.result;
      else inContext(message.progress);
    });
    await once(this.thread, 'exit');
    return result;
  }

  /** Ends the search at its next step; the result holds what it has. */
  stop(): void {
    Atomics.store(new Int32Array(this.stopFlag), 0, 1);
  }

  /** Ends the thread at once; its work is lost here and done again elsewhere. */
  async abandon(): Promise<void> {
    await this.thread.terminate();
  }
}
