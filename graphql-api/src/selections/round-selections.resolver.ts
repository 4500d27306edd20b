import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Round } from '../rounds/entities/round.entity.js';
import { Selection } from './entities/selection.entity.js';
import { SelectionsService } from './selections.service.js';

@Resolver(() => Round)
export class RoundSelectionsResolver {
  constructor(private readonly service: SelectionsService) {}

  @ResolveField(() => [Selection], { description: 'Newest first.' })
  selections(@Parent() round: Round) {
    return this.service.ofRound(round.id);
  }
}
