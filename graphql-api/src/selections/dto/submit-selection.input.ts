import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { IsInt, IsUUID, MaxLength, Min } from 'class-validator';

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
  @MaxLength(2_000, { message: 'The reason has at most 2000 characters' })
  reason: string;
}
