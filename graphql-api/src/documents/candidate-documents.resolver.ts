import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { DocumentsByCandidateLoader } from './documents.loaders.js';
import { Document } from './entities/document.entity.js';

@Resolver(() => Candidate)
export class CandidateDocumentsResolver {
  constructor(private readonly documentsByCandidate: DocumentsByCandidateLoader) {}

  @ResolveField(() => [Document], { description: 'Oldest first.' })
  documents(@Parent() { id }: Candidate) {
    return this.documentsByCandidate.load(id);
  }
}
