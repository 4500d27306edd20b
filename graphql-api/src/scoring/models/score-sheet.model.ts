import { Field, Int, ObjectType } from '@nestjs/graphql';
import { Candidate } from '../../candidates/entities/candidate.entity.js';
import { Membership } from '../../memberships/entities/membership.entity.js';
import { Round } from '../../rounds/entities/round.entity.js';
import { Criterion } from '../entities/criterion.entity.js';
import { Score } from '../entities/score.entity.js';

@ObjectType({ description: 'How many scores an assessor has given; never which.' })
export class AssessorProgress {
  @Field(() => Membership)
  membership: Membership;

  @Field(() => Int)
  given: number;

  @Field(() => Int)
  of: number;
}

@ObjectType()
export class ScoreSheet {
  @Field(() => Round)
  round: Round;

  @Field(() => [Candidate])
  candidates: Candidate[];

  @Field(() => [Criterion])
  criteria: Criterion[];

  @Field(() => [Score], { description: 'The viewer’s own scores.' })
  own: Score[];

  @Field(() => [Score], { description: 'Empty until scoring has closed.' })
  others: Score[];

  @Field(() => [AssessorProgress])
  assessors: AssessorProgress[];
}
