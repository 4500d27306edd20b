import { CombinedGraphQLErrors } from '@apollo/client';

/** What the API says about a refused request, or what we know when no answer came. */
type ErrorCode =
  | 'UNAUTHENTICATED'
  | 'FORBIDDEN'
  | 'NOT_FOUND'
  | 'BAD_USER_INPUT'
  | 'CONFLICT'
  | 'WRONG_STAGE'
  | 'TOO_MANY_REQUESTS'
  | 'STORAGE_UNAVAILABLE'
  | 'INTERNAL_SERVER_ERROR'
  | 'OFFLINE';

const KNOWN: ReadonlySet<string> = new Set<ErrorCode>([
  'UNAUTHENTICATED',
  'FORBIDDEN',
  'NOT_FOUND',
  'BAD_USER_INPUT',
  'CONFLICT',
  'WRONG_STAGE',
  'TOO_MANY_REQUESTS',
  'STORAGE_UNAVAILABLE',
]);

/** No answer came at all. */
export class OfflineError extends Error {}

/** The code of any error a query or mutation can end in; a code we do not know counts as the server's own fault. */
export function errorCode(error: unknown): ErrorCode {
  if (error instanceof OfflineError) return 'OFFLINE';
  if (!CombinedGraphQLErrors.is(error)) return 'INTERNAL_SERVER_ERROR';
  const code = error.errors[0]?.extensions?.code;
  return typeof code === 'string' && KNOWN.has(code) ? (code as ErrorCode) : 'INTERNAL_SERVER_ERROR';
}

/** The number the log of the API knows the request by, when the answer carried one. */
export function requestId(error: unknown): string | undefined {
  if (!CombinedGraphQLErrors.is(error)) return undefined;
  const id = error.errors[0]?.extensions?.requestId;
  return typeof id === 'string' ? id : undefined;
}

/** Messages per field of a refused input, such as `{ 'fields.unitPrice': 'Write an amount of zero or more.' }`. */
export function fieldErrors(error: unknown): Record<string, string> {
  if (!CombinedGraphQLErrors.is(error)) return {};
  const fields = error.errors[0]?.extensions?.fields;
  if (!Array.isArray(fields)) return {};
  return Object.fromEntries(fields.map(({ field, message }) => [String(field), String(message)]));
}

/** One sentence a person can act on. Our own API words its refusals; only the rest is worded here. */
export function errorMessage(error: unknown): string {
  const code = errorCode(error);
  if (code === 'OFFLINE') return 'The server did not answer. Check the connection, then try again.';
  if (code === 'INTERNAL_SERVER_ERROR')
    return 'Something on our side failed. Nothing was saved by half; try again.';
  return CombinedGraphQLErrors.is(error)
    ? (error.errors[0]?.message ?? 'That was refused.')
    : 'That was refused.';
}
