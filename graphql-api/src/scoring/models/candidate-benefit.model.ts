import { Field, Int, ObjectType } from '@nestjs/graphql';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';

@ObjectType({ description: 'Weighted mean of the scores, 0 to 100.' })
export class CandidateBenefit {
  @Field(() => DecimalScalar)
  points: string;

  @Field(() => DecimalScalar, { description: 'As the least convinced assessor sees it.' })
  lowest: string;

  @Field(() => DecimalScalar, { description: 'As the most convinced assessor sees it.' })
  highest: string;

  @Field(() => Int)
  missingScores: number;
}
