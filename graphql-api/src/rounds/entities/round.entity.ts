import { Field, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn, VersionColumn } from 'typeorm';
import { safeInteger } from '../../common/bigint.transformer.js';
import { CalendarDateScalar } from '../../common/scalars/calendar-date.scalar.js';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';
import { RoundStage } from '../round-stages.js';

export enum PaymentTiming {
  END_OF_YEAR = 'END_OF_YEAR',
  MIDDLE_OF_YEAR = 'MIDDLE_OF_YEAR',
}

registerEnumType(PaymentTiming, {
  name: 'PaymentTiming',
  description: 'When in the year yearly costs are paid.',
});

@ObjectType()
@Entity('round')
export class Round {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Field()
  @Column('text')
  name: string;

  @Field(() => RoundStage)
  @Column('text')
  stage: RoundStage;

  @Field(() => CalendarDateScalar)
  @Column('date')
  openedOn: string;

  @Field(() => CalendarDateScalar)
  @Column('date')
  scoringClosesOn: string;

  @Field(() => CalendarDateScalar)
  @Column('date')
  decisionDate: string;

  @Column('bigint', { transformer: safeInteger })
  ceilingMinor: number;

  @Field(() => DecimalScalar, {
    description: 'Share of the ceiling that is not spent in the round, in percent.',
  })
  @Column('numeric')
  heldBackPercent: string;

  @Field(() => DecimalScalar, { description: 'Real rate, such as 0.035.' })
  @Column('numeric')
  discountRate: string;

  @Field(() => PaymentTiming)
  @Column('text')
  paymentTiming: PaymentTiming;

  @Field(() => DecimalScalar, { description: 'Such as 0.2. It cannot be recovered, so budgets are gross.' })
  @Column('numeric')
  vatRate: string;

  @Field(() => Int)
  @Column('int')
  longestLeadWeeks: number;

  @Field()
  @Column('text')
  priceBasis: string;

  @Field(() => Int)
  @VersionColumn()
  version: number;
}
