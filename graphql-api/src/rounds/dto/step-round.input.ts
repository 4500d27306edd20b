import { createUnionType, Field, ID, InputType, Int, ObjectType } from '@nestjs/graphql';
import { IsInt, IsUUID, MinLength } from 'class-validator';
import { IsText } from '../../common/text.validators.js';
import { Round } from '../entities/round.entity.js';

@InputType()
export class AdvanceRoundInput {
  @Field(() => ID)
  @IsUUID()
  roundId: string;

  @Field(() => Int)
  @IsInt()
  version: number;
}

@InputType()
export class StepBackRoundInput extends AdvanceRoundInput {
  @Field()
  @IsText(1_000)
  @MinLength(3, { message: 'Say why the round goes back' })
  reason: string;
}

@ObjectType()
export class RoundNotReady {
  @Field()
  message: string;

  @Field(() => [String])
  missing: string[];
}

export const AdvanceRoundResult = createUnionType({
  name: 'AdvanceRoundResult',
  types: () => [Round, RoundNotReady] as const,
  resolveType: (value) => ('missing' in value ? RoundNotReady : Round),
});
