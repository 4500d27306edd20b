import { ResolveField, Resolver } from '@nestjs/graphql';
import { Viewer } from '../memberships/models/viewer.model.js';
import { Round } from './entities/round.entity.js';
import { RoundsService } from './rounds.service.js';

@Resolver(() => Viewer)
export class ViewerRoundsResolver {
  constructor(private readonly service: RoundsService) {}

  @ResolveField(() => [Round], { description: 'Newest first.' })
  rounds() {
    return this.service.all();
  }
}
