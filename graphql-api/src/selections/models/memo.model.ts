import { Field, Int, ObjectType } from '@nestjs/graphql';
import { MoneyModel } from '../../common/models/money.model.js';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';
import { CostAxis } from '../../frontier/cost-axis.enum.js';
import { CertificateStatus } from '../../frontier/models/run-parts.model.js';

@ObjectType({ description: 'A candidate that would be bought, by its quote.' })
export class MemoLine {
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

  @Field()
  quoteNumber: string;

  @Field(() => MoneyModel)
  capital: MoneyModel;

  @Field(() => MoneyModel)
  lifeCycleCost: MoneyModel;

  @Field(() => DecimalScalar)
  benefit: string;

  @Field()
  mandatory: boolean;
}

@ObjectType({ description: 'A candidate that would not be bought, and why.' })
export class MemoLeftOut {
  @Field()
  code: string;

  @Field()
  name: string;

  @Field(() => MoneyModel, { nullable: true })
  capital: MoneyModel | null;

  @Field(() => DecimalScalar, { nullable: true })
  benefit: string | null;

  @Field()
  reason: string;
}

@ObjectType()
export class MemoCaution {
  @Field()
  title: string;

  @Field()
  text: string;
}

@ObjectType()
export class MemoAssumption {
  @Field()
  name: string;

  @Field()
  text: string;
}

@ObjectType()
export class MemoLimitUse {
  @Field()
  name: string;

  @Field(() => DecimalScalar)
  used: string;

  @Field(() => DecimalScalar, { nullable: true })
  least: string | null;

  @Field(() => DecimalScalar, { nullable: true })
  most: string | null;
}

/** Kept as JSON in the selection's row and fingerprinted as it is. */
@ObjectType({ description: 'The approval paper: what, for how much, what not and why, on what assumptions.' })
export class Memo {
  @Field()
  roundName: string;

  @Field(() => Int)
  runNumber: number;

  @Field(() => CostAxis)
  costAxis: CostAxis;

  @Field(() => CertificateStatus)
  certificateStatus: CertificateStatus;

  @Field(() => MoneyModel)
  capital: MoneyModel;

  @Field(() => MoneyModel)
  lifeCycleCost: MoneyModel;

  @Field(() => DecimalScalar)
  benefit: string;

  @Field(() => MoneyModel)
  ceiling: MoneyModel;

  @Field(() => MoneyModel, { description: 'The ceiling without the share held back.' })
  spendable: MoneyModel;

  @Field(() => MoneyModel, { description: 'Of what may be spent.' })
  leftUnderCeiling: MoneyModel;

  @Field(() => [MemoLine])
  lines: MemoLine[];

  @Field(() => [MemoLeftOut])
  leftOut: MemoLeftOut[];

  @Field(() => [MemoCaution])
  cautions: MemoCaution[];

  @Field(() => [MemoAssumption])
  assumptions: MemoAssumption[];

  @Field(() => [MemoLimitUse])
  limitUses: MemoLimitUse[];
}
