import { ArgsType, Field, Int } from '@nestjs/graphql';
import { IsInt, Max, Min } from 'class-validator';

export const LARGEST_PAGE = 100;

/** Numbered pages for tables. */
@ArgsType()
export class PageArgs {
  @Field(() => Int, { defaultValue: 1 })
  @IsInt()
  @Min(1)
  page: number;

  @Field(() => Int, { defaultValue: 50 })
  @IsInt()
  @Min(1)
  @Max(LARGEST_PAGE)
  pageSize: number;
}
