import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { Type } from 'class-transformer';
import {
  IsBoolean,
  IsInt,
  IsOptional,
  IsString,
  IsUUID,
  Length,
  Max,
  Min,
  ValidateNested,
} from 'class-validator';
import { IsAmount } from '../../common/amount.validators.js';
import { CalendarDateScalar } from '../../common/scalars/calendar-date.scalar.js';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';
import { IsFilledText, IsText } from '../../common/text.validators.js';

@InputType()
export class QuoteFieldsInput {
  @Field({ description: 'A vendor not known yet is added.' })
  @IsFilledText(200)
  vendorName: string;

  @Field()
  @IsFilledText(100)
  number: string;

  @Field(() => CalendarDateScalar)
  @IsString()
  quoteDate: string;

  @Field(() => CalendarDateScalar)
  @IsString()
  validUntil: string;

  @Field({ description: 'ISO 4217; the organisation’s own or one with a rate in the round.' })
  @Length(3, 3, { message: 'currency is a code of three letters, such as EUR' })
  currency: string;

  @Field()
  @IsBoolean()
  pricesIncludeVat: boolean;

  @Field(() => DecimalScalar)
  @IsAmount()
  unitPrice: string;

  @Field(() => Int)
  @IsInt()
  @Min(1)
  @Max(1_000)
  quantity: number;

  @Field(() => DecimalScalar)
  @IsAmount()
  delivery: string;

  @Field(() => DecimalScalar)
  @IsAmount()
  installation: string;

  @Field(() => DecimalScalar)
  @IsAmount()
  training: string;

  @Field(() => DecimalScalar)
  @IsAmount()
  discount: string;

  @Field(() => Int)
  @IsInt()
  @Min(0)
  @Max(50)
  warrantyYears: number;

  @Field()
  @IsText(500)
  serviceTier: string;

  @Field(() => DecimalScalar, {
    nullable: true,
    description: 'With VAT, for all pieces. Empty: no price given.',
  })
  @IsOptional()
  @IsAmount()
  serviceYearly?: string | null;

  @Field(() => Int)
  @IsInt()
  @Min(0)
  @Max(520)
  leadWeeks: number;

  @Field()
  @IsText(20)
  incoterm: string;

  @Field()
  @IsText(200)
  namedPlace: string;

  @Field()
  @IsText(500)
  paymentTerms: string;

  @Field(() => ID, {
    nullable: true,
    description: 'An uploaded document of the same candidate, to be attached.',
  })
  @IsOptional()
  @IsUUID()
  documentId?: string | null;
}

@InputType()
export class CreateQuoteInput {
  @Field(() => ID)
  @IsUUID()
  candidateId: string;

  @Field(() => QuoteFieldsInput)
  @ValidateNested()
  @Type(() => QuoteFieldsInput)
  fields: QuoteFieldsInput;
}

@InputType()
export class UpdateQuoteInput {
  @Field(() => ID)
  @IsUUID()
  id: string;

  @Field(() => Int)
  @IsInt()
  version: number;

  @Field(() => QuoteFieldsInput)
  @ValidateNested()
  @Type(() => QuoteFieldsInput)
  fields: QuoteFieldsInput;
}
