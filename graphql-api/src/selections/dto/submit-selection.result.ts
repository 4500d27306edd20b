import { createUnionType, Field, ObjectType } from '@nestjs/graphql';
import { Selection } from '../entities/selection.entity.js';

@ObjectType()
export class SelectionAlreadyOpen {
  @Field()
  message: string;

  constructor() {
    this.message = 'A portfolio of this round has been submitted or approved already. Nothing was submitted.';
  }
}

@ObjectType({ description: 'The round changed since the run was frozen.' })
export class RunOutdated {
  @Field()
  message: string;

  constructor(number: number) {
    this.message = `Candidates, quotes, scores or limits have changed since run ${number} was started. Search again, then submit.`;
  }
}

export const SubmitSelectionResult = createUnionType({
  name: 'SubmitSelectionResult',
  types: () => [Selection, SelectionAlreadyOpen, RunOutdated] as const,
  resolveType: (value) =>
    [SelectionAlreadyOpen, RunOutdated].find((refusal) => value instanceof refusal) ?? Selection,
});
