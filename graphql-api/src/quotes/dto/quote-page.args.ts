import { ArgsType, Field, ID, InputType } from '@nestjs/graphql';
import { Type } from 'class-transformer';
import { IsBoolean, IsOptional, IsUUID, ValidateNested } from 'class-validator';
import { PageArgs } from '../../common/page.args.js';
import { IsText } from '../../common/text.validators.js';

@InputType()
export class QuoteFilter {
  @Field(() => String, {
    nullable: true,
    description: 'In the number, the vendor, and the candidate’s code and name.',
  })
  @IsOptional()
  @IsText(200)
  search?: string | null;

  @Field(() => Boolean, { nullable: true })
  @IsOptional()
  @IsBoolean()
  faultyOnly?: boolean | null;
}

@ArgsType()
export class QuotePageArgs extends PageArgs {
  @Field(() => ID)
  @IsUUID()
  roundId: string;

  @Field(() => QuoteFilter, { nullable: true })
  @IsOptional()
  @ValidateNested()
  @Type(() => QuoteFilter)
  filter?: QuoteFilter | null;
}
