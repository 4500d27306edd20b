import { Injectable, type ExecutionContext } from '@nestjs/common';
import { GqlExecutionContext } from '@nestjs/graphql';
import { AuthGuard } from '@nestjs/passport';
import type { GraphQLResolveInfo } from 'graphql';
import { ForbiddenError, UnauthenticatedError } from '../common/domain-error.js';
import { requestScope, type Caller } from '../tenancy/request-context.js';
import type { GraphqlContext } from './graphql-context.js';
import { OPERATION_ROLES, PUBLIC } from './operation-roles.js';

/** Stands before every root field: who is it, and does the table of roles allow the operation? */
@Injectable()
export class SessionGuard extends AuthGuard('jwt') {
  override async canActivate(context: ExecutionContext): Promise<boolean> {
    if (context.getType<string>() !== 'graphql') return true;
    const operation = GqlExecutionContext.create(context).getInfo<GraphQLResolveInfo>().fieldName;
    const allowed = OPERATION_ROLES[operation] ?? [];
    if (allowed === PUBLIC) return true;
    await super.canActivate(context);
    const { caller } = requestScope();
    if (!caller?.roles.some((role) => allowed.includes(role))) throw new ForbiddenError(allowed);
    return true;
  }

  override getRequest(context: ExecutionContext) {
    return GqlExecutionContext.create(context).getContext<GraphqlContext>().req;
  }

  /** A token that does not hold comes without an error; an error means that we could not find out. */
  override handleRequest<T>(error: Error | null, caller: Caller | false): T {
    if (error) throw error;
    if (!caller) throw new UnauthenticatedError();
    requestScope().caller = caller;
    return caller as T;
  }
}
