import { Field, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { MoneyModel } from '../../common/models/money.model.js';
import { Membership } from '../../memberships/entities/membership.entity.js';
import { Department } from '../../organisations/entities/department.entity.js';

export enum ToSettleKind {
  NO_OPEN_QUOTE = 'NO_OPEN_QUOTE',
  QUOTE_ENDS_EARLY = 'QUOTE_ENDS_EARLY',
  SERVICE_PRICE_MISSING = 'SERVICE_PRICE_MISSING',
  SCORE_MISSING = 'SCORE_MISSING',
  SCORES_FAR_APART = 'SCORES_FAR_APART',
  EITHER_OR_PAIR = 'EITHER_OR_PAIR',
}

registerEnumType(ToSettleKind, { name: 'ToSettleKind' });

@ObjectType({ description: 'Something that stands between the round and a sound decision.' })
export class ToSettle {
  @Field(() => ToSettleKind)
  kind: ToSettleKind;

  @Field()
  title: string;

  @Field()
  detail: string;

  @Field(() => Membership, { nullable: true, description: 'Who can settle it.' })
  by: Membership | null;

  @Field(() => [ID])
  candidateIds: string[];
}

@ObjectType()
export class DepartmentAsk {
  @Field(() => Department)
  department: Department;

  @Field(() => MoneyModel)
  asked: MoneyModel;

  @Field(() => Int)
  candidates: number;
}

@ObjectType()
export class RoundOverview {
  @Field(() => [ToSettle])
  toSettle: ToSettle[];

  @Field(() => Int, { description: 'Checks of the same kinds that found nothing.' })
  settled: number;

  @Field(() => MoneyModel, { description: 'Capital of all candidates by their quotes in force.' })
  asked: MoneyModel;

  @Field(() => [DepartmentAsk], { description: 'The most first.' })
  askedByDepartment: DepartmentAsk[];

  @Field(() => Int)
  scoresGiven: number;

  @Field(() => Int)
  scoresWanted: number;

  @Field(() => Int, { description: 'Quotes without a fault.' })
  quotesUsable: number;

  @Field(() => Int)
  quotes: number;

  @Field(() => Int)
  candidates: number;
}

@ObjectType()
export class RoundCounts {
  @Field(() => Int)
  candidates: number;

  @Field(() => Int)
  quotes: number;

  @Field(() => Int, { description: 'Candidates without a quote in force.' })
  quotesToSettle: number;

  @Field(() => Int, { description: 'An assessor’s own until scoring closes; everybody’s otherwise.' })
  scoresMissing: number;
}
