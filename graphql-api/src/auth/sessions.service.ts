import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import type { Role } from '../memberships/role.enum.js';
import type { Caller } from '../tenancy/request-context.js';

export interface Account {
  userId: string;
  passwordHash: string;
}

export interface Session {
  sessionId: string;
  userId: string;
  organisationId: string;
}

export interface MembershipOfUser {
  organisationId: string;
  organisationName: string;
  roles: Role[];
}

/** The identity functions of the database, one method each. They are the only way to people and sessions. */
@Injectable()
export class SessionsService {
  constructor(private readonly dataSource: DataSource) {}

  async findAccount(email: string): Promise<Account | undefined> {
    return this.first<Account>(
      `select user_id as "userId", password_hash as "passwordHash" from identity.find_user($1)`,
      [email],
    );
  }

  membershipsOf(userId: string): Promise<MembershipOfUser[]> {
    return this.dataSource.query(
      `select organisation_id as "organisationId", organisation_name as "organisationName", roles from identity.memberships_of($1)`,
      [userId],
    );
  }

  async open(userId: string, organisationId: string, tokenHash: Buffer): Promise<string | null> {
    const opened = await this.first<{ id: string | null }>('select identity.open_session($1, $2, $3) as id', [
      userId,
      organisationId,
      tokenHash,
    ]);
    return opened?.id ?? null;
  }

  rotate(oldHash: Buffer, newHash: Buffer): Promise<Session | undefined> {
    return this.first<Session>(
      `select session_id as "sessionId", user_id as "userId", organisation_id as "organisationId"
       from identity.rotate_session($1, $2)`,
      [oldHash, newHash],
    );
  }

  async switchTo(sessionId: string, organisationId: string): Promise<boolean> {
    const moved = await this.first<{ moved: boolean }>('select identity.switch_session($1, $2) as moved', [
      sessionId,
      organisationId,
    ]);
    return moved?.moved ?? false;
  }

  async end(sessionId: string): Promise<void> {
    await this.dataSource.query('select identity.end_session($1)', [sessionId]);
  }

  async caller(sessionId: string, organisationId: string): Promise<Caller | undefined> {
    const found = await this.first<{ userId: string; membershipId: string; roles: Role[] }>(
      `select user_id as "userId", membership_id as "membershipId", roles from identity.caller($1, $2)`,
      [sessionId, organisationId],
    );
    return found && { ...found, sessionId, organisationId };
  }

  private async first<T>(sql: string, parameters: unknown[]): Promise<T | undefined> {
    const rows = await this.dataSource.query<T[]>(sql, parameters);
    return rows[0];
  }
}
