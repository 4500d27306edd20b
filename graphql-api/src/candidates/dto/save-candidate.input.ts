import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { Type } from 'class-transformer';
import { IsBoolean, IsEnum, IsInt, IsUUID, Matches, Max, Min, ValidateNested } from 'class-validator';
import { IsAmount, IsPercent, IsQuantity } from '../../common/amount.validators.js';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';
import { IsFilledText, IsText } from '../../common/text.validators.js';
import { CandidateKind } from '../candidate-kind.enum.js';

@InputType()
export class CandidateFieldsInput {
  @Field()
  @IsFilledText(200)
  name: string;

  @Field()
  @IsText(4_000)
  need: string;

  @Field(() => ID)
  @IsUUID()
  departmentId: string;

  @Field(() => ID)
  @IsUUID()
  siteId: string;

  @Field(() => CandidateKind)
  @IsEnum(CandidateKind)
  kind: CandidateKind;

  @Field()
  @IsText(200)
  genericGroup: string;

  @Field(() => Int)
  @IsInt()
  @Min(1)
  @Max(1_000)
  quantity: number;

  @Field(() => Int)
  @IsInt()
  @Min(1)
  @Max(50)
  usefulLifeYears: number;

  @Field(() => DecimalScalar)
  @IsPercent()
  residualPercent: string;

  @Field(() => DecimalScalar)
  @IsAmount()
  worksNet: string;

  @Field(() => DecimalScalar)
  @IsAmount()
  consumablesYearly: string;

  @Field(() => DecimalScalar, { description: 'Negative where less is used than now.' })
  @Matches(/^-?\d{1,13}(\.\d{1,3})?$/, { message: 'energyYearly must be an amount, such as 1250.00 or -300' })
  energyYearly: string;

  @Field(() => DecimalScalar)
  @IsAmount()
  currentRunningYearly: string;

  @Field(() => DecimalScalar)
  @IsQuantity()
  installationDays: string;

  @Field(() => DecimalScalar)
  @IsQuantity()
  floorAreaM2: string;

  @Field()
  @IsBoolean()
  mandatory: boolean;

  @Field()
  @IsText(1_000)
  mandatoryReason: string;
}

@InputType()
export class CreateCandidateInput {
  @Field(() => ID)
  @IsUUID()
  roundId: string;

  @Field(() => CandidateFieldsInput)
  @ValidateNested()
  @Type(() => CandidateFieldsInput)
  fields: CandidateFieldsInput;
}

@InputType()
export class UpdateCandidateInput {
  @Field(() => ID)
  @IsUUID()
  id: string;

  @Field(() => Int)
  @IsInt()
  version: number;

  @Field(() => CandidateFieldsInput)
  @ValidateNested()
  @Type(() => CandidateFieldsInput)
  fields: CandidateFieldsInput;
}
