import { Field, InputType } from '@nestjs/graphql';
import { MaxLength, MinLength } from 'class-validator';

@InputType()
export class SignInInput {
  @Field()
  @MinLength(1, { message: 'Write your e-mail address' })
  @MaxLength(254, { message: 'An e-mail address has at most 254 characters' })
  email: string;

  @Field()
  @MaxLength(1_000, { message: 'A password has at most 72 bytes' })
  password: string;
}
