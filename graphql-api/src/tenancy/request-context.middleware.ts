import { randomUUID } from 'node:crypto';
import type { NextFunction, Request, Response } from 'express';
import { runInScope } from './request-context.js';

/** Opens the context of an HTTP request and gives it an id that the answer, errors and logs carry. */
export function requestContext(_request: Request, response: Response, next: NextFunction) {
  const requestId = randomUUID();
  response.setHeader('x-request-id', requestId);
  runInScope({ requestId, loaders: new Map() }, next);
}
