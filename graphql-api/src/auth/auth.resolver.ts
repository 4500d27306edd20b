import { Args, Context, ID, Mutation, Resolver } from '@nestjs/graphql';
import { AuthService } from './auth.service.js';
import { SignInInput } from './dto/sign-in.input.js';
import { SignedIn, SignInResult } from './dto/sign-in.result.js';
import type { GraphqlContext } from './graphql-context.js';

@Resolver()
export class AuthResolver {
  constructor(private readonly auth: AuthService) {}

  @Mutation(() => SignInResult)
  signIn(@Args('input') input: SignInInput, @Context() { res }: GraphqlContext) {
    return this.auth.signIn(input, res);
  }

  @Mutation(() => SignedIn)
  refreshSession(@Context() { req, res }: GraphqlContext) {
    return this.auth.refresh(req, res);
  }

  @Mutation(() => Boolean)
  signOut(@Context() { res }: GraphqlContext) {
    return this.auth.signOut(res);
  }

  @Mutation(() => SignedIn)
  switchOrganisation(@Args('organisationId', { type: () => ID }) organisationId: string) {
    return this.auth.switchOrganisation(organisationId);
  }
}
