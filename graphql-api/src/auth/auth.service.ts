import { Injectable } from '@nestjs/common';
import type { Request, Response } from 'express';
import { AuditService } from '../audit/audit.service.js';
import { NotFoundError, UnauthenticatedError } from '../common/domain-error.js';
import { isUuid } from '../tenancy/find-or-throw.js';
import { currentCaller, requestScope } from '../tenancy/request-context.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { SignInInput } from './dto/sign-in.input.js';
import { SignedIn, SignInRefused } from './dto/sign-in.result.js';
import { passwordMatches } from './passwords.js';
import { clearRefreshCookie, readRefreshCookie, writeRefreshCookie } from './refresh-cookie.js';
import { SessionsService } from './sessions.service.js';
import { TokensService } from './tokens.service.js';

@Injectable()
export class AuthService {
  constructor(
    private readonly sessions: SessionsService,
    private readonly tokens: TokensService,
    private readonly db: TenantDatabase,
    private readonly audit: AuditService,
  ) {}

  /** One answer for an unknown address, a wrong password and a person without a clinic group. */
  async signIn({ email, password }: SignInInput, response: Response): Promise<SignedIn | SignInRefused> {
    const refused: SignInRefused = { message: 'The e-mail address or the password is not right.' };
    const account = await this.sessions.findAccount(email);
    if (!(await passwordMatches(password, account?.passwordHash)) || !account) return refused;
    const [membership] = await this.sessions.membershipsOf(account.userId);
    if (!membership) return refused;

    const refreshToken = this.tokens.newRefreshToken();
    const { organisationId } = membership;
    const sessionId = await this.sessions.open(
      account.userId,
      organisationId,
      this.tokens.hashOf(refreshToken),
    );
    if (!sessionId) return refused;
    await this.record('session.opened', sessionId, organisationId);
    writeRefreshCookie(response, refreshToken);
    return { accessToken: await this.tokens.accessToken(sessionId, organisationId) };
  }

  /** A new access token for the refresh cookie, whose token is replaced at each use. */
  async refresh(request: Request, response: Response): Promise<SignedIn> {
    const refreshToken = readRefreshCookie(request);
    if (!refreshToken) throw new UnauthenticatedError();
    const successor = this.tokens.successorOf(refreshToken);
    const session = await this.sessions.rotate(
      this.tokens.hashOf(refreshToken),
      this.tokens.hashOf(successor),
    );
    if (!session) {
      clearRefreshCookie(response);
      throw new UnauthenticatedError();
    }
    writeRefreshCookie(response, successor);
    return { accessToken: await this.tokens.accessToken(session.sessionId, session.organisationId) };
  }

  async signOut(response: Response): Promise<boolean> {
    const { sessionId } = currentCaller();
    if (sessionId) await this.sessions.end(sessionId);
    clearRefreshCookie(response);
    return true;
  }

  /** Moves the session to another organisation of the same person. */
  async switchOrganisation(organisationId: string): Promise<SignedIn> {
    const { sessionId } = currentCaller();
    if (!sessionId || !isUuid(organisationId) || !(await this.sessions.switchTo(sessionId, organisationId))) {
      throw new NotFoundError('organisation', organisationId);
    }
    await this.record('session.opened', sessionId, organisationId);
    return { accessToken: await this.tokens.accessToken(sessionId, organisationId) };
  }

  private async record(action: 'session.opened', sessionId: string, organisationId: string) {
    requestScope().caller = await this.sessions.caller(sessionId, organisationId);
    await this.db.transaction((em) => this.audit.record(em, action, {}));
  }
}
