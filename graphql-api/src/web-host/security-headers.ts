import { randomBytes } from 'node:crypto';
import type { NextFunction, Request, Response } from 'express';
import helmet from 'helmet';

/** A fresh nonce per response; pages carry it on their script and style elements. */
export function pageNonce(_request: Request, response: Response, next: NextFunction) {
  response.locals.nonce = randomBytes(16).toString('base64');
  next();
}

// The live region of the component library hides itself by this one style, which cannot carry a nonce.
const LIVE_REGION_STYLE = "'sha256-DTxLo/p0U68OvQ0C/ZBm32x0lyr7xl7Dd6LHwBsg7sc='";

/** `storageOrigin`: where the browser posts uploads to and fetches documents from. */
export function securityHeaders(storageOrigin: string, production: boolean) {
  const nonce = (_request: unknown, response: { locals?: { nonce?: string } }) =>
    `'nonce-${response.locals?.nonce ?? ''}'`;
  return helmet({
    hsts: production,
    referrerPolicy: { policy: 'no-referrer' },
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'none'"],
        scriptSrc: ["'self'", nonce as never],
        styleSrc: ["'self'", nonce as never, LIVE_REGION_STYLE],
        // the chart library sets style attributes
        styleSrcAttr: ["'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'", storageOrigin],
        manifestSrc: ["'self'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        objectSrc: ["'none'"],
      },
    },
  });
}
