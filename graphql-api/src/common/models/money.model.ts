import { Field, ObjectType } from '@nestjs/graphql';
import { formatDecimal, money } from '@metewand/money';
import { DecimalScalar } from '../scalars/decimal.scalar.js';

@ObjectType('Money')
export class MoneyModel {
  @Field(() => DecimalScalar)
  amount: string;

  @Field()
  currency: string;
}

/** Minor units on the way out to the API. */
export function toMoneyModel(minor: number, currency: string): MoneyModel {
  return { amount: formatDecimal(money(minor, currency)), currency };
}
