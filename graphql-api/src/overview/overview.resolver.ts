import { Args, ID, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { Round } from '../rounds/entities/round.entity.js';
import { RoundCounts, RoundOverview } from './models/round-overview.model.js';
import { OverviewService } from './overview.service.js';

@Resolver(() => Round)
export class OverviewResolver {
  constructor(private readonly overview: OverviewService) {}

  @Query(() => RoundOverview)
  roundOverview(@Args('roundId', { type: () => ID }) roundId: string) {
    return this.overview.ofRound(roundId);
  }

  @ResolveField(() => RoundCounts)
  counts(@Parent() round: Round) {
    return this.overview.countsOfRound(round.id);
  }
}
