import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { IsEnum, IsInt, IsOptional, IsUUID, Min } from 'class-validator';
import { CostAxis } from '../cost-axis.enum.js';

@InputType()
export class StartSearchInput {
  @Field(() => ID)
  @IsUUID()
  roundId: string;

  @Field(() => CostAxis)
  @IsEnum(CostAxis)
  costAxis: CostAxis;

  @Field(() => Int, { nullable: true, description: 'The same figures and seed give the same result.' })
  @IsOptional()
  @IsInt()
  @Min(0, { message: 'A seed is a whole number of zero or more' })
  seed?: number | null;
}
