import { createUnionType, Field, ObjectType } from '@nestjs/graphql';
import { Selection } from '../entities/selection.entity.js';
import type { SelectionState } from '../selection-transitions.js';

@ObjectType()
export class SelectionAlreadyDecided {
  @Field()
  message: string;

  constructor(number: number, state: SelectionState) {
    this.message = `Memo ${number} was ${state.toLowerCase()} already. Your decision was not saved.`;
  }
}

@ObjectType({ description: 'Nobody decides on what they submitted themselves.' })
export class OwnSubmission {
  @Field()
  message: string;

  constructor() {
    this.message = 'You submitted this portfolio, so somebody else has to decide on it.';
  }
}

@ObjectType()
export class CommentNeeded {
  @Field()
  message: string;

  constructor() {
    this.message = 'Say in a comment why you return or decline it, so that the submitter knows what to do.';
  }
}

export const DecideSelectionResult = createUnionType({
  name: 'DecideSelectionResult',
  types: () => [Selection, SelectionAlreadyDecided, OwnSubmission, CommentNeeded] as const,
  resolveType: (value) =>
    [SelectionAlreadyDecided, OwnSubmission, CommentNeeded].find((refusal) => value instanceof refusal) ??
    Selection,
});
