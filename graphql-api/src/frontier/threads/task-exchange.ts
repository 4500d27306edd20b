import type { PackedResult, PackedTask, TaskName } from './packed-task.js';

/** Where a search lays out tasks for other processes, and finds what came of them. */
export interface TaskExchange {
  exchange(request: ExchangeRequest): Promise<ExchangeAnswer>;
}

/** Plain data: it travels between threads. */
export interface ExchangeRequest {
  /** Tasks that anybody may take. */
  readonly offer: readonly PackedTask[];
  /** What was done here, for whoever has to begin this search again. */
  readonly done: readonly PackedResult[];
  /** Tasks whose results are asked for. */
  readonly wanted: readonly TaskName[];
  /** So many of the tasks offered that nobody has taken are to be done here. */
  readonly claim: number;
}

export interface ExchangeAnswer {
  readonly finished: readonly Uint8Array[];
  /** Ids of the tasks that are to be done here. */
  readonly claimed: readonly string[];
}
