import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { IsEnum, IsInt, IsUUID, MaxLength } from 'class-validator';
import { Decision } from '../selection-transitions.js';

@InputType()
export class DecideSelectionInput {
  @Field(() => ID)
  @IsUUID()
  id: string;

  @Field(() => Int)
  @IsInt()
  version: number;

  @Field(() => Decision)
  @IsEnum(Decision)
  decision: Decision;

  @Field()
  @MaxLength(2_000, { message: 'A comment has at most 2000 characters' })
  comment: string;
}
