import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { IsInt, IsUUID, Min } from 'class-validator';
import { IsText } from '../../common/text.validators.js';

@InputType()
export class SubmitSelectionInput {
  @Field(() => ID)
  @IsUUID()
  runId: string;

  @Field(() => Int, { description: 'Index into the points of the run.' })
  @IsInt()
  @Min(0)
  pointIndex: number;

  @Field()
  @IsText(2_000)
  reason: string;
}
