import { AsyncResource } from 'node:async_hooks';
import { once } from 'node:events';
import type { Worker } from 'node:worker_threads';
import type {
  ExchangeReply,
  RunProgressRow,
  RunResultRow,
  SearchMessage,
  SearchOrder,
} from './run-result.js';
import type { ExchangeRequest, TaskExchange } from './threads/task-exchange.js';

export interface SearchListener {
  /** As it comes; the search does not wait for it. */
  onProgress(progress: RunProgressRow): void;
  exchange: TaskExchange['exchange'];
}

/** A search in a thread of its own, so that the process goes on answering its database and its signals. */
export class SearchHost {
  private readonly stopFlag = new SharedArrayBuffer(Int32Array.BYTES_PER_ELEMENT);

  /** @param thread one that waits for an order; it ends with this search */
  constructor(
    private readonly thread: Worker,
    order: Omit<SearchOrder, 'stop'>,
  ) {
    const complete: SearchOrder = { ...order, stop: this.stopFlag };
    thread.postMessage(complete);
  }

  /**
   * Resolves with the result, or with nothing once the thread was abandoned. Rejects when the thread breaks. The
   * listener is called in the caller's context.
   */
  async result(listener: SearchListener): Promise<RunResultRow | undefined> {
    let result: RunResultRow | undefined;
    const hear = AsyncResource.bind((message: SearchMessage) => {
      if (message.kind === 'result') result = message.result;
      else if (message.kind === 'progress') listener.onProgress(message.progress);
      else void this.answer(message.number, message.request, listener);
    });
    this.thread.on('message', hear);
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

  /** Without an answer the search goes on alone. */
  private async answer(number: number, request: ExchangeRequest, { exchange }: SearchListener) {
    const answer = await exchange(request).catch(() => undefined);
    const reply: ExchangeReply = { number, answer };
    this.thread.postMessage(reply);
  }
}
