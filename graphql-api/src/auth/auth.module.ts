import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { AuditModule } from '../audit/audit.module.js';
import { ENV, type Env } from '../config/env.js';
import { AuthResolver } from './auth.resolver.js';
import { AuthService } from './auth.service.js';
import { JwtStrategy } from './jwt.strategy.js';
import { SessionGuard } from './session.guard.js';
import { SessionsService } from './sessions.service.js';
import { TokensService } from './tokens.service.js';

@Module({
  imports: [
    PassportModule,
    AuditModule,
    JwtModule.registerAsync({
      inject: [ENV],
      useFactory: (env: Env) => ({ privateKey: env.jwtPrivateKey }),
    }),
  ],
  providers: [
    AuthResolver,
    AuthService,
    SessionsService,
    TokensService,
    JwtStrategy,
    { provide: APP_GUARD, useClass: SessionGuard },
  ],
  exports: [SessionsService],
})
export class AuthModule {}
