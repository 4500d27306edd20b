import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { IsBoolean, IsInt, IsOptional, IsUUID, Max, Min } from 'class-validator';
import { HIGHEST_POINTS } from '@metewand/scoring';
import { IsText } from '../../common/text.validators.js';

const POINTS_MESSAGE = `Give whole points from 0 to ${HIGHEST_POINTS}`;

@InputType()
export class SaveScoreInput {
  @Field(() => ID)
  @IsUUID()
  candidateId: string;

  @Field(() => ID)
  @IsUUID()
  criterionId: string;

  @Field(() => Int, { nullable: true, description: 'Left out when the assessor cannot judge.' })
  @IsOptional()
  @IsInt({ message: POINTS_MESSAGE })
  @Min(0, { message: POINTS_MESSAGE })
  @Max(HIGHEST_POINTS, { message: POINTS_MESSAGE })
  points?: number | null;

  @Field()
  @IsBoolean()
  cannotJudge: boolean;

  @Field()
  @IsText(2_000)
  reason: string;
}
