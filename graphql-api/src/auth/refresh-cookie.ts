import type { Request, Response } from 'express';

const NAME = '__Host-metewand-refresh';
const THIRTY_DAYS = 30 * 24 * 3600 * 1000;
const options = { httpOnly: true, secure: true, sameSite: 'strict', path: '/' } as const;

/** The refresh token never reaches a script: it travels in this cookie only. */
export function writeRefreshCookie(response: Response, token: string) {
  response.cookie(NAME, token, { ...options, maxAge: THIRTY_DAYS });
}

export function clearRefreshCookie(response: Response) {
  response.clearCookie(NAME, options);
}

export function readRefreshCookie(request: Request): string | undefined {
  const pair = (request.headers.cookie ?? '').split(/;\s*/).find((part) => part.startsWith(`${NAME}=`));
  return pair?.slice(NAME.length + 1);
}
