import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { CandidatesByIdLoader } from './candidates-by-id.loader.js';
import { Candidate } from './entities/candidate.entity.js';
import { Link } from './entities/link.entity.js';
import { MembersByLinkLoader } from './links.loader.js';

@Resolver(() => Link)
export class LinksResolver {
  constructor(
    private readonly candidatesById: CandidatesByIdLoader,
    private readonly membersByLink: MembersByLinkLoader,
  ) {}

  @ResolveField(() => Candidate, {
    nullable: true,
    description: 'The one that needs the members; empty for other kinds.',
  })
  candidate(@Parent() { candidateId }: Link) {
    return candidateId && this.candidatesById.load(candidateId);
  }

  @ResolveField(() => [Candidate], { description: 'By code.' })
  members(@Parent() { id }: Link) {
    return this.membersByLink.load(id);
  }
}
