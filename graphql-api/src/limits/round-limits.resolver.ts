import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Round } from '../rounds/entities/round.entity.js';
import { Limit } from './entities/limit.entity.js';
import { LimitsService } from './limits.service.js';

@Resolver(() => Round)
export class RoundLimitsResolver {
  constructor(private readonly service: LimitsService) {}

  @ResolveField(() => [Limit])
  limits(@Parent() round: Round) {
    return this.service.ofRound(round.id);
  }
}
