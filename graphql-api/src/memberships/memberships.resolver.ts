import { Query, Resolver } from '@nestjs/graphql';
import { MembershipsService } from './memberships.service.js';
import { Viewer } from './models/viewer.model.js';

@Resolver(() => Viewer)
export class MembershipsResolver {
  constructor(private readonly memberships: MembershipsService) {}

  @Query(() => Viewer)
  viewer() {
    return this.memberships.viewer();
  }
}
