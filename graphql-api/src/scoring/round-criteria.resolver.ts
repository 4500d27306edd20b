import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Round } from '../rounds/entities/round.entity.js';
import { CriteriaService } from './criteria.service.js';
import { Criterion } from './entities/criterion.entity.js';

@Resolver(() => Round)
export class RoundCriteriaResolver {
  constructor(private readonly service: CriteriaService) {}

  @ResolveField(() => [Criterion])
  criteria(@Parent() round: Round) {
    return this.service.ofRound(round.id);
  }
}
