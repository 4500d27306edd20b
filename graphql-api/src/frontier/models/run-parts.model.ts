import { Field, Float, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { MoneyModel } from '../../common/models/money.model.js';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';

export enum CertificateStatus {
  COMPLETE = 'COMPLETE',
  BOUNDED = 'BOUNDED',
  UNPROVEN = 'UNPROVEN',
  INFEASIBLE = 'INFEASIBLE',
}

registerEnumType(CertificateStatus, {
  name: 'CertificateStatus',
  description:
    'How far it is proven that the front is all there is. BOUNDED: nothing lies above the bound. UNPROVEN: nothing better was found, no more.',
});

@ObjectType({ description: 'One portfolio of a front.' })
export class RunPoint {
  @Field(() => DecimalScalar)
  benefit: string;

  @Field(() => MoneyModel, { description: 'On the axis of the run.' })
  cost: MoneyModel;

  @Field(() => MoneyModel)
  capital: MoneyModel;

  @Field(() => [Int], { description: 'Indices of the run’s items.' })
  picks: number[];

  @Field(() => DecimalScalar, {
    nullable: true,
    description:
      'No portfolio of at most this cost has more benefit than so much more; empty while nothing is proven.',
  })
  atMostMore: string | null;
}

@ObjectType({ description: 'What else there is at the cost of a point.' })
export class PointAlternatives {
  @Field(() => Int, {
    description: 'Portfolios with just this benefit and cost, the point’s own among them.',
  })
  count: number;

  @Field(() => RunPoint, {
    nullable: true,
    description:
      'The best of the same cost with less benefit, where it has more than the next cheaper point.',
  })
  nextBest: RunPoint | null;

  @Field({ description: 'False: not all could be looked at in time, so there may be more and better ones.' })
  isExact: boolean;
}

@ObjectType({ description: 'A candidate by its quote in force, as frozen when the run was started.' })
export class RunItem {
  @Field(() => ID)
  candidateId: string;

  @Field(() => ID)
  quoteId: string;

  @Field()
  code: string;

  @Field()
  name: string;

  @Field()
  siteName: string;

  @Field()
  departmentName: string;

  @Field()
  vendorName: string;

  @Field(() => DecimalScalar)
  benefit: string;

  @Field(() => MoneyModel)
  capital: MoneyModel;

  @Field(() => MoneyModel)
  lifeCycleCost: MoneyModel;

  @Field()
  mandatory: boolean;
}

@ObjectType({ description: 'A candidate that the run could not choose.' })
export class RunLeftOut {
  @Field(() => ID)
  candidateId: string;

  @Field()
  code: string;

  @Field()
  name: string;

  @Field()
  reason: string;

  @Field()
  mandatory: boolean;
}

@ObjectType({ description: 'Points for drawing only, in currency units and benefit points.' })
export class ChartPoints {
  @Field(() => [Float])
  costs: number[];

  @Field(() => [Float])
  benefits: number[];
}

@ObjectType()
export class RunProgress {
  @Field(() => Float, { description: 'Portfolios whose benefit and cost were worked out.' })
  evaluations: number;

  @Field(() => Int)
  kept: number;

  @Field(() => Float)
  lookedAt: number;

  @Field(() => DecimalScalar, { nullable: true })
  bestBenefit: string | null;

  @Field(() => Float, { description: 'How much of the cost axis is proven, 0 to 1.' })
  share: number;
}

@ObjectType()
export class RunCertificate {
  @Field(() => CertificateStatus)
  status: CertificateStatus;

  @Field(() => [[Float]], { description: 'Stretches of cost, [from, to], in which nothing is missing.' })
  provenStretches: number[][];

  @Field(() => ChartPoints, { description: 'Steps that no portfolio passes; empty while nothing is proven.' })
  bound: ChartPoints;

  @Field(() => Float, {
    nullable: true,
    description: 'At most so much of the area below the bound is missing; empty while nothing is proven.',
  })
  gapPercent: number | null;

  @Field(() => Float, { description: 'How much of the cost axis lies in proven stretches, 0 to 1.' })
  provenShare: number;
}
