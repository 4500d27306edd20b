import { Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Candidate } from '../candidates/entities/candidate.entity.js';
import { BenefitByCandidateLoader } from './benefit-by-candidate.loader.js';
import { CandidateBenefit } from './models/candidate-benefit.model.js';

@Resolver(() => Candidate)
export class CandidateBenefitResolver {
  constructor(private readonly benefitByCandidate: BenefitByCandidateLoader) {}

  @ResolveField(() => CandidateBenefit, { nullable: true, description: 'Empty until scoring has closed.' })
  benefit(@Parent() candidate: Candidate) {
    return this.benefitByCandidate.load(candidate);
  }
}
