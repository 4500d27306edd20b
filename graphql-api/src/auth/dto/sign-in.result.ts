import { createUnionType, Field, ObjectType } from '@nestjs/graphql';

@ObjectType()
export class SignedIn {
  @Field({ description: 'Good for ten minutes; sent as Bearer with every request.' })
  accessToken: string;
}

@ObjectType()
export class SignInRefused {
  @Field()
  message: string;
}

export const SignInResult = createUnionType({
  name: 'SignInResult',
  types: () => [SignedIn, SignInRefused] as const,
  resolveType: (value) => ('accessToken' in value ? SignedIn : SignInRefused),
});
