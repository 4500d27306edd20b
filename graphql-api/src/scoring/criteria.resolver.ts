import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { DecimalScalar } from '../common/scalars/decimal.scalar.js';
import { Criterion } from './entities/criterion.entity.js';
import { WeightByCriterionLoader } from './weight-by-criterion.loader.js';

@Resolver(() => Criterion)
export class CriteriaResolver {
  constructor(private readonly weightByCriterion: WeightByCriterionLoader) {}

  @ResolveField(() => DecimalScalar, { description: 'Share of all swing weights of the round, 0 to 1.' })
  weight(@Parent() criterion: Criterion) {
    return this.weightByCriterion.load(criterion);
  }
}
