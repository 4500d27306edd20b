import DataLoader from 'dataloader';
import { requestScope } from '../tenancy/request-context.js';
import { NotFoundError } from './domain-error.js';

/**
 * A DataLoader made once per request from a singleton. Loaders serve resolvers; services do not call them,
 * or a batch would join a transaction that may be over.
 */
export abstract class RequestLoader<K, V> {
  private readonly key = Symbol(this.constructor.name);

  protected abstract batch(keys: readonly K[]): Promise<(V | Error)[]>;

  load(key: K): Promise<V> {
    return this.loader.load(key);
  }

  private get loader(): DataLoader<K, V> {
    const scope = requestScope();
    const held = scope.loaders.get(this.key) as DataLoader<K, V> | undefined;
    if (held) return held;
    const made = new DataLoader<K, V>((keys) => this.batch(keys));
    scope.loaders.set(this.key, made);
    return made;
  }
}

/** Puts rows in the order of the ids; an id without a row is NOT_FOUND. */
export function inOrderOf<R extends { id: string }>(
  ids: readonly string[],
  rows: readonly R[],
  what: string,
): (R | NotFoundError)[] {
  const byId = new Map(rows.map((row) => [row.id, row]));
  return ids.map((id) => byId.get(id) ?? new NotFoundError(what, id));
}

/** Puts rows in the order of the keys, several rows a key. */
export function groupByKey<K, R>(keys: readonly K[], rows: readonly R[], keyOf: (row: R) => K): R[][] {
  const groups = new Map<K, R[]>(keys.map((key) => [key, []]));
  for (const row of rows) groups.get(keyOf(row))?.push(row);
  return keys.map((key) => groups.get(key) ?? []);
}
