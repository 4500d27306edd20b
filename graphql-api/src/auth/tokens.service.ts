import { createHash, createHmac, createPrivateKey, createPublicKey, randomBytes } from 'node:crypto';
import { Inject, Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { ENV, type Env } from '../config/env.js';

const ACCESS_TOKEN_SECONDS = 600;
export const TOKEN_ISSUER = 'metewand';
export const TOKEN_AUDIENCE = 'metewand-api';

export interface AccessClaims {
  sid: string;
  org: string;
}

/** Access tokens are short-lived ES256 JWTs; refresh tokens are opaque, and only their hash is stored. */
@Injectable()
export class TokensService {
  private readonly rotationKey: Buffer;

  constructor(
    @Inject(ENV) env: Env,
    private readonly jwt: JwtService,
  ) {
    this.rotationKey = createHash('sha256').update('refresh rotation').update(env.jwtPrivateKey).digest();
  }

  accessToken(sessionId: string, organisationId: string): Promise<string> {
    return this.jwt.signAsync({ sid: sessionId, org: organisationId } satisfies AccessClaims, {
      algorithm: 'ES256',
      expiresIn: ACCESS_TOKEN_SECONDS,
      issuer: TOKEN_ISSUER,
      audience: TOKEN_AUDIENCE,
    });
  }

  newRefreshToken(): string {
    return randomBytes(32).toString('base64url');
  }

  /** The same old token always has the same successor, so that a lost reply can be asked for again. */
  successorOf(refreshToken: string): string {
    return createHmac('sha256', this.rotationKey).update(refreshToken).digest('base64url');
  }

  hashOf(refreshToken: string): Buffer {
    return createHash('sha256').update(refreshToken).digest();
  }
}

/** The public half of the signing key, as PEM. */
export function publicKeyOf(privateKeyPem: string): string {
  return createPublicKey(createPrivateKey(privateKeyPem)).export({ type: 'spki', format: 'pem' }).toString();
}
