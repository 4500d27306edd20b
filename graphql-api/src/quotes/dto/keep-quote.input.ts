import { createUnionType, Field, ID, InputType, Int, ObjectType } from '@nestjs/graphql';
import { IsInt, IsOptional, IsUUID } from 'class-validator';
import { Candidate } from '../../candidates/entities/candidate.entity.js';
import { IsText } from '../../common/text.validators.js';

@InputType()
export class KeepQuoteInput {
  @Field(() => ID)
  @IsUUID()
  candidateId: string;

  @Field(() => ID, { nullable: true, description: 'Empty: back to the round’s rule.' })
  @IsOptional()
  @IsUUID()
  quoteId?: string | null;

  @Field()
  @IsText(1_000)
  reason: string;

  @Field(() => Int, { description: 'Of the candidate.' })
  @IsInt()
  version: number;
}

@ObjectType()
export class QuoteNotUsable {
  @Field()
  message: string;

  constructor(number: string, faults: readonly string[]) {
    this.message = `Quote ${number} cannot be kept: ${faults.join('; ')}. Have the vendor amend it, or keep another.`;
  }
}

export const KeepQuoteResult = createUnionType({
  name: 'KeepQuoteResult',
  types: () => [Candidate, QuoteNotUsable] as const,
});
