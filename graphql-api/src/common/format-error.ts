import { Logger } from '@nestjs/common';
import type { GraphQLFormattedError } from 'graphql';
import { unwrapResolverError } from '@apollo/server/errors';
import { currentRequestId } from '../tenancy/request-context.js';
import { DomainError } from './domain-error.js';

const log = new Logger('GraphQL');
const SAFE_CODES = new Set([
  'GRAPHQL_PARSE_FAILED',
  'GRAPHQL_VALIDATION_FAILED',
  'BAD_REQUEST',
  'BAD_USER_INPUT',
  'OPERATION_RESOLUTION_FAILURE',
  'PERSISTED_QUERY_NOT_SUPPORTED',
]);

/** The only way out for errors: a code, words a person can act on, the request's id, and nothing of our insides. */
export function formatError(formatted: GraphQLFormattedError, error: unknown): GraphQLFormattedError {
  const original = unwrapResolverError(error);
  const requestId = currentRequestId();
  const place = { path: formatted.path, locations: formatted.locations };
  if (original instanceof DomainError) {
    return {
      message: original.message,
      ...place,
      extensions: { code: original.code, requestId, ...original.details },
    };
  }
  const code = formatted.extensions?.code;
  if (
    typeof code === 'string' &&
    SAFE_CODES.has(code) &&
    !(original instanceof Error && original.name === 'QueryFailedError')
  ) {
    return { message: formatted.message, locations: formatted.locations, extensions: { code, requestId } };
  }
  log.error(
    `${requestId} ${original instanceof Error ? (original.stack ?? original.message) : String(original)}`,
  );
  return {
    message: 'Something went wrong on our side. Nothing of this step was saved.',
    path: formatted.path,
    extensions: { code: 'INTERNAL_SERVER_ERROR', requestId },
  };
}
