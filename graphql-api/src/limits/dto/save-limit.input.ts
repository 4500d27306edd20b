import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { Type } from 'class-transformer';
import { IsEnum, IsInt, IsOptional, IsUUID, Matches, MinLength, ValidateNested } from 'class-validator';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';
import { IsText } from '../../common/text.validators.js';
import { LimitMeasure } from '../entities/limit.entity.js';

const BOUND = /^-?\d{1,11}(\.\d{1,2})?$/;
const BOUND_MESSAGE = 'Write the bound as a number with at most two decimals, such as 30000.00';

@InputType()
export class LimitFieldsInput {
  @Field()
  @IsText(120)
  @MinLength(1, { message: 'Give the limit a name' })
  name: string;

  @Field(() => LimitMeasure)
  @IsEnum(LimitMeasure)
  measure: LimitMeasure;

  @Field(() => ID, { nullable: true, description: 'Only candidates of this site count.' })
  @IsOptional()
  @IsUUID()
  siteId?: string | null;

  @Field(() => DecimalScalar, { nullable: true })
  @IsOptional()
  @Matches(BOUND, { message: BOUND_MESSAGE })
  least?: string | null;

  @Field(() => DecimalScalar, { nullable: true })
  @IsOptional()
  @Matches(BOUND, { message: BOUND_MESSAGE })
  most?: string | null;
}

@InputType()
export class CreateLimitInput {
  @Field(() => ID)
  @IsUUID()
  roundId: string;

  @Field(() => LimitFieldsInput)
  @ValidateNested()
  @Type(() => LimitFieldsInput)
  fields: LimitFieldsInput;
}

@InputType()
export class UpdateLimitInput {
  @Field(() => ID)
  @IsUUID()
  id: string;

  @Field(() => Int)
  @IsInt()
  version: number;

  @Field(() => LimitFieldsInput)
  @ValidateNested()
  @Type(() => LimitFieldsInput)
  fields: LimitFieldsInput;
}
