import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { IsEnum, IsInt, IsUUID } from 'class-validator';
import { IsText } from '../../common/text.validators.js';
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
  @IsText(2_000)
  comment: string;
}
