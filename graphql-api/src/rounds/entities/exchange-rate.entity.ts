import { Field, ObjectType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import { CalendarDateScalar } from '../../common/scalars/calendar-date.scalar.js';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';

@ObjectType({ description: 'One unit of the currency in the organisation’s, frozen for the round.' })
@Entity('exchange_rate')
export class ExchangeRate {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  roundId: string;

  @Field()
  @Column('char', { length: 3 })
  currency: string;

  @Field(() => DecimalScalar)
  @Column('numeric')
  rate: string;

  @Field(() => CalendarDateScalar)
  @Column('date')
  asOf: string;

  @Field()
  @Column('text')
  source: string;
}
