import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Candidate } from './entities/candidate.entity.js';
import { Link } from './entities/link.entity.js';
import { LinksByCandidateLoader } from './links.loader.js';

@Resolver(() => Candidate)
export class CandidateLinksResolver {
  constructor(private readonly linksByCandidate: LinksByCandidateLoader) {}

  @ResolveField(() => [Link])
  links(@Parent() { id }: Candidate) {
    return this.linksByCandidate.load(id);
  }
}
