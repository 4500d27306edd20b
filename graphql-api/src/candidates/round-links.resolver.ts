import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Round } from '../rounds/entities/round.entity.js';
import { Link } from './entities/link.entity.js';
import { LinksByRoundLoader } from './links.loader.js';

@Resolver(() => Round)
export class RoundLinksResolver {
  constructor(private readonly linksByRound: LinksByRoundLoader) {}

  @ResolveField(() => [Link])
  links(@Parent() { id }: Round) {
    return this.linksByRound.load(id);
  }
}
