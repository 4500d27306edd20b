import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { IsInt, IsUUID } from 'class-validator';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';
import { IsAmount, IsPercent } from '../../common/amount.validators.js';

@InputType()
export class SetCeilingInput {
  @Field(() => ID)
  @IsUUID()
  roundId: string;

  @Field(() => Int)
  @IsInt()
  version: number;

  @Field(() => DecimalScalar)
  @IsAmount()
  ceiling: string;

  @Field(() => DecimalScalar)
  @IsPercent()
  heldBackPercent: string;
}
