import { AsyncLocalStorage } from 'node:async_hooks';
import { UnauthenticatedError } from '../common/domain-error.js';
import type { Role } from '../memberships/role.enum.js';

/** Who asks, for which organisation. Taken from the verified token or from the job row, never from an argument. */
export interface Caller {
  organisationId: string;
  membershipId: string | null;
  userId: string | null;
  sessionId: string | null;
  roles: readonly Role[];
}

export interface RequestScope {
  requestId: string;
  caller?: Caller;
  loaders: Map<symbol, unknown>;
}

const storage = new AsyncLocalStorage<RequestScope>();

/** Opens the context of one HTTP request or one job. */
export function runInScope<T>(scope: RequestScope, work: () => T): T {
  return storage.run(scope, work);
}

export function requestScope(): RequestScope {
  const scope = storage.getStore();
  if (!scope) throw new Error('No request context is open.');
  return scope;
}

export function currentRequestId(): string {
  return storage.getStore()?.requestId ?? 'none';
}

/** The signed-in caller, or UNAUTHENTICATED. */
export function currentCaller(): Caller {
  const caller = storage.getStore()?.caller;
  if (!caller) throw new UnauthenticatedError();
  return caller;
}

/** The membership of the signed-in person. Jobs have none. */
export function currentMembershipId(): string {
  const { membershipId } = currentCaller();
  if (!membershipId) throw new UnauthenticatedError();
  return membershipId;
}
