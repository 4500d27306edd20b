import { ArgsType, Field, ID, InputType, registerEnumType } from '@nestjs/graphql';
import { Type } from 'class-transformer';
import { IsEnum, IsOptional, IsUUID, ValidateNested } from 'class-validator';
import { PageArgs } from '../common/page.args.js';
import { IsText } from '../common/text.validators.js';

export enum CandidateView {
  ALL = 'ALL',
  SOMETHING_MISSING = 'SOMETHING_MISSING',
  MANDATORY = 'MANDATORY',
}

export enum CandidateSortKey {
  CODE = 'CODE',
  NAME = 'NAME',
  DEPARTMENT = 'DEPARTMENT',
  SITE = 'SITE',
  CAPITAL = 'CAPITAL',
  LIFE_CYCLE_COST = 'LIFE_CYCLE_COST',
  BENEFIT = 'BENEFIT',
}

export enum SortDirection {
  ASC = 'ASC',
  DESC = 'DESC',
}

registerEnumType(CandidateView, {
  name: 'CandidateView',
  description: 'SOMETHING_MISSING: no quote in force, or scores missing as far as the viewer may see.',
});
registerEnumType(CandidateSortKey, { name: 'CandidateSortKey' });
registerEnumType(SortDirection, { name: 'SortDirection' });

@InputType()
export class CandidateFilter {
  @Field(() => CandidateView, { nullable: true })
  @IsOptional()
  @IsEnum(CandidateView)
  view?: CandidateView | null;

  @Field(() => String, { nullable: true, description: 'In code, name, department and generic group.' })
  @IsOptional()
  @IsText(200)
  search?: string | null;

  @Field(() => ID, { nullable: true })
  @IsOptional()
  @IsUUID()
  departmentId?: string | null;

  @Field(() => ID, { nullable: true })
  @IsOptional()
  @IsUUID()
  siteId?: string | null;
}

@InputType()
export class CandidateSort {
  @Field(() => CandidateSortKey)
  @IsEnum(CandidateSortKey)
  key: CandidateSortKey;

  @Field(() => SortDirection)
  @IsEnum(SortDirection)
  direction: SortDirection;
}

@ArgsType()
export class CandidatePageArgs extends PageArgs {
  @Field(() => ID)
  @IsUUID()
  roundId: string;

  @Field(() => CandidateFilter, { nullable: true })
  @IsOptional()
  @ValidateNested()
  @Type(() => CandidateFilter)
  filter?: CandidateFilter | null;

  @Field(() => CandidateSort, { nullable: true, description: 'By code when empty.' })
  @IsOptional()
  @ValidateNested()
  @Type(() => CandidateSort)
  sort?: CandidateSort | null;
}
