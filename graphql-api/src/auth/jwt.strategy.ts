import { Inject, Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { ExtractJwt, Strategy } from 'passport-jwt';
import { ENV, type Env } from '../config/env.js';
import type { Caller } from '../tenancy/request-context.js';
import { SessionsService } from './sessions.service.js';
import { publicKeyOf, TOKEN_AUDIENCE, TOKEN_ISSUER, type AccessClaims } from './tokens.service.js';

/** Verifies the access token, then asks the database whether its session and membership still stand. */
@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy) {
  constructor(
    @Inject(ENV) env: Env,
    private readonly sessions: SessionsService,
  ) {
    super({
      jwtFromRequest: ExtractJwt.fromAuthHeaderAsBearerToken(),
      secretOrKey: publicKeyOf(env.jwtPrivateKey),
      algorithms: ['ES256'],
      issuer: TOKEN_ISSUER,
      audience: TOKEN_AUDIENCE,
    });
  }

  async validate(claims: AccessClaims): Promise<Caller | false> {
    return (await this.sessions.caller(claims.sid, claims.org)) ?? false;
  }
}
