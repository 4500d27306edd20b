import { createUnionType, Field, ObjectType } from '@nestjs/graphql';
import { Run } from '../entities/run.entity.js';

@ObjectType({ description: 'No portfolio can meet every limit; the notes name what collides.' })
export class LimitsCollide {
  @Field()
  message: string;

  @Field(() => [String])
  notes: string[];

  constructor(notes: string[]) {
    this.message = 'No portfolio can meet all limits and links of this round.';
    this.notes = notes;
  }
}

@ObjectType()
export class NothingToSearch {
  @Field()
  message: string;

  constructor(message: string) {
    this.message = message;
  }
}

@ObjectType()
export class SearchAlreadyRunning {
  @Field()
  message: string;

  constructor(number: number) {
    this.message = `Run ${number} is still under way. Wait for its end, or stop and keep it.`;
  }
}

export const StartSearchResult = createUnionType({
  name: 'StartSearchResult',
  types: () => [Run, LimitsCollide, NothingToSearch, SearchAlreadyRunning] as const,
  resolveType: (value) =>
    [LimitsCollide, NothingToSearch, SearchAlreadyRunning].find((refusal) => value instanceof refusal) ?? Run,
});
