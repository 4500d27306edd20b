import { Field, InputType } from '@nestjs/graphql';
import { MaxLength, MinLength } from 'class-validator';
import { IsText } from '../../common/text.validators.js';

@InputType()
export class SignInInput {
  @Field()
  @IsText(254)
  @MinLength(1, { message: 'Write your e-mail address' })
  email: string;

  @Field()
  @MaxLength(1_000, { message: 'A password has at most 72 bytes' })
  password: string;
}
