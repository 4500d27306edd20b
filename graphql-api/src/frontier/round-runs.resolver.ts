import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Round } from '../rounds/entities/round.entity.js';
import { Run } from './entities/run.entity.js';
import { RunsService } from './runs.service.js';

@Resolver(() => Round)
export class RoundRunsResolver {
  constructor(private readonly service: RunsService) {}

  @ResolveField(() => [Run], { description: 'Newest first.' })
  runs(@Parent() round: Round) {
    return this.service.ofRound(round.id);
  }
}
