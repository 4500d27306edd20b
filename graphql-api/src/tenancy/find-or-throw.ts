import type { EntityManager, EntityTarget, FindOptionsWhere } from 'typeorm';
import { ConflictError, NotFoundError } from '../common/domain-error.js';

interface Identified {
  id: string;
}

interface Versioned extends Identified {
  version: number;
}

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** An id of any other shape cannot exist, and PostgreSQL would refuse to compare it. */
export function isUuid(id: string): boolean {
  return UUID.test(id);
}

/** The row with this id within the organisation. Another organisation's id looks like one that does not exist. */
export async function findOrThrow<T extends Identified>(
  em: EntityManager,
  entity: EntityTarget<T>,
  what: string,
  id: string,
) {
  const row = isUuid(id) ? await em.findOneBy(entity, { id } as FindOptionsWhere<T>) : null;
  if (!row) throw new NotFoundError(what, id);
  return row;
}

/** The same, locked for this transaction. */
export async function lockOrThrow<T extends Identified>(
  em: EntityManager,
  entity: EntityTarget<T>,
  what: string,
  id: string,
) {
  const where = { id } as FindOptionsWhere<T>;
  const row = isUuid(id) ? await em.findOne(entity, { where, lock: { mode: 'pessimistic_write' } }) : null;
  if (!row) throw new NotFoundError(what, id);
  return row;
}

/** The same, if nobody changed it since `version` was read. */
export async function lockVersion<T extends Versioned>(
  em: EntityManager,
  entity: EntityTarget<T>,
  what: string,
  id: string,
  version: number,
) {
  const row = await lockOrThrow(em, entity, what, id);
  if (row.version !== version) throw new ConflictError(what, row.version);
  return row;
}
