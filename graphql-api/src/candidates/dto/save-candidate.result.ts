import { createUnionType, Field, ObjectType } from '@nestjs/graphql';
import { Candidate } from '../entities/candidate.entity.js';

@ObjectType()
export class MandatoryNeedsReason {
  @Field()
  message: string =
    'A mandatory candidate is bought whatever its benefit. Write the reason: which duty or proof asks for it.';
}

export const SaveCandidateResult = createUnionType({
  name: 'SaveCandidateResult',
  types: () => [Candidate, MandatoryNeedsReason] as const,
});
