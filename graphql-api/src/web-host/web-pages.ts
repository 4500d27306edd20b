import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { NextFunction, Request, Response } from 'express';
import express from 'express';

/** The built web application: hashed files for ever, and one page for every other address. */
export function webFiles(webDist: string) {
  return express.static(webDist, { index: false, setHeaders: cacheHashedFiles });
}

function cacheHashedFiles(response: Response, path: string) {
  response.setHeader(
    'cache-control',
    path.includes('/assets/') ? 'public, max-age=31536000, immutable' : 'no-cache',
  );
}

const NOT_PAGES = /^\/(graphql|live|ready)(\/|$)/;

export function webPage(webDist: string) {
  const file = join(webDist, 'index.html');
  return (request: Request, response: Response, next: NextFunction) => {
    const isPage = request.method === 'GET' && request.accepts('html') && !NOT_PAGES.test(request.path);
    if (!isPage || !existsSync(file)) return next();
    const page = readFileSync(file, 'utf8').replaceAll('__NONCE__', response.locals.nonce as string);
    response.setHeader('cache-control', 'no-store');
    response.type('html').send(page);
  };
}
