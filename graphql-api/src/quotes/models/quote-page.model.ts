import { Field, Int, ObjectType } from '@nestjs/graphql';
import { Quote } from '../entities/quote.entity.js';

@ObjectType()
export class QuotePage {
  @Field(() => [Quote], { description: 'By candidate, then by number.' })
  items: Quote[];

  @Field(() => Int)
  total: number;

  @Field(() => Int)
  page: number;

  @Field(() => Int)
  pageSize: number;
}
