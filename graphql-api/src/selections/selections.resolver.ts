import { Args, ID, Mutation, Parent, Query, ResolveField, Resolver } from '@nestjs/graphql';
import { Membership } from '../memberships/entities/membership.entity.js';
import { MembershipsByIdLoader } from '../memberships/memberships-by-id.loader.js';
import { DecideSelectionInput } from './dto/decide-selection.input.js';
import { DecideSelectionResult } from './dto/decide-selection.result.js';
import { SubmitSelectionInput } from './dto/submit-selection.input.js';
import { SubmitSelectionResult } from './dto/submit-selection.result.js';
import { Selection } from './entities/selection.entity.js';
import { SelectionsService } from './selections.service.js';
import { SubmissionsService } from './submissions.service.js';

@Resolver(() => Selection)
export class SelectionsResolver {
  constructor(
    private readonly selections: SelectionsService,
    private readonly submissions: SubmissionsService,
    private readonly membershipsById: MembershipsByIdLoader,
  ) {}

  @Query(() => Selection)
  selection(@Args('id', { type: () => ID }) id: string) {
    return this.selections.find(id);
  }

  @Mutation(() => SubmitSelectionResult)
  submitSelection(@Args('input') input: SubmitSelectionInput) {
    return this.submissions.submit(input);
  }

  @Mutation(() => DecideSelectionResult)
  decideSelection(@Args('input') input: DecideSelectionInput) {
    return this.selections.decide(input);
  }

  @ResolveField(() => Membership, { name: 'submittedBy' })
  submitter(@Parent() { submittedBy }: Selection) {
    return this.membershipsById.load(submittedBy);
  }

  @ResolveField(() => Membership, { name: 'decidedBy', nullable: true })
  decider(@Parent() { decidedBy }: Selection) {
    return decidedBy && this.membershipsById.load(decidedBy);
  }
}
