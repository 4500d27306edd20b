import { Field, Int, ObjectType } from '@nestjs/graphql';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { MoneyModel } from '../common/models/money.model.js';

@ObjectType()
export class CandidatePage {
  @Field(() => [Candidate])
  items: Candidate[];

  @Field(() => Int, { description: 'How many the filter lets through.' })
  total: number;

  @Field(() => Int)
  page: number;

  @Field(() => Int)
  pageSize: number;

  @Field(() => Int, { description: 'How many the round holds, whatever the filter.' })
  all: number;

  @Field(() => Int)
  somethingMissing: number;

  @Field(() => Int)
  mandatory: number;

  @Field(() => MoneyModel, { description: 'Capital of the round’s quotes in force together.' })
  askedFor: MoneyModel;
}
