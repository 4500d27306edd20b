import { Field, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import type { CostPartKind as KernelPartKind, QuoteCost } from '@metewand/costing';
import { MoneyModel, toMoneyModel } from '../../common/models/money.model.js';

/** The kernel's parts under the names of the API; the compiler sees to it that none is missing. */
export const CostPartKind = {
  ACQUISITION: 'ACQUISITION',
  DELIVERY: 'DELIVERY',
  INSTALLATION: 'INSTALLATION',
  TRAINING: 'TRAINING',
  WORKS: 'WORKS',
  SERVICE: 'SERVICE',
  CONSUMABLES: 'CONSUMABLES',
  ENERGY: 'ENERGY',
  RESIDUAL: 'RESIDUAL',
} as const satisfies { [Kind in KernelPartKind]: Kind };

registerEnumType(CostPartKind, { name: 'CostPartKind' });

@ObjectType('CostPart')
export class CostPartModel {
  @Field(() => CostPartKind)
  kind: KernelPartKind;

  @Field(() => MoneyModel, { description: 'Present value; the residual is below zero.' })
  amount: MoneyModel;
}

@ObjectType('YearlyCost')
export class YearlyCostModel {
  @Field(() => Int, { description: '0 is now.' })
  year: number;

  @Field(() => MoneyModel)
  amount: MoneyModel;

  @Field(() => MoneyModel)
  presentValue: MoneyModel;
}

@ObjectType('QuoteCost', {
  description: 'Gross, in the organisation’s currency. A missing service price counts as nothing.',
})
export class QuoteCostModel {
  @Field(() => MoneyModel, { description: 'What is paid now.' })
  capital: MoneyModel;

  @Field(() => MoneyModel, { description: 'Present value of everything over the useful life.' })
  lifeCycleCost: MoneyModel;

  @Field(() => MoneyModel, { description: 'The level yearly payment that is worth the life-cycle cost.' })
  equivalentAnnualCost: MoneyModel;

  @Field(() => MoneyModel, { description: 'Service, consumables and energy of a year after the warranty.' })
  runningYearly: MoneyModel;

  @Field(() => MoneyModel, {
    description: 'The same less what the replaced unit costs; below zero is a saving.',
  })
  addedRunningYearly: MoneyModel;

  @Field(() => [CostPartModel], { description: 'They add up to the life-cycle cost.' })
  parts: CostPartModel[];

  @Field(() => Int, { description: 'The useful life.' })
  years: number;

  @Field(() => [YearlyCostModel], {
    description: 'From year 0 on; the present values add up to the life-cycle cost.',
  })
  yearly: YearlyCostModel[];
}

export function toQuoteCostModel(cost: QuoteCost): QuoteCostModel {
  const inMoney = (minor: number) => toMoneyModel(minor, cost.currency);
  return {
    capital: inMoney(cost.capitalGrossMinor),
    lifeCycleCost: inMoney(cost.lifeCycleCostMinor),
    equivalentAnnualCost: inMoney(cost.equivalentAnnualCostMinor),
    runningYearly: inMoney(cost.runningYearlyGrossMinor),
    addedRunningYearly: inMoney(cost.incrementalRunningYearlyMinor),
    parts: cost.parts.map(({ kind, presentMinor }) => ({ kind, amount: inMoney(presentMinor) })),
    years: cost.years.length - 1,
    yearly: cost.years.map(({ year, totalMinor, presentMinor }) => ({
      year,
      amount: inMoney(totalMinor),
      presentValue: inMoney(presentMinor),
    })),
  };
}
