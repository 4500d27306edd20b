import { Field, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn, VersionColumn } from 'typeorm';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';

export enum LimitMeasure {
  ADDED_RUNNING_COST = 'ADDED_RUNNING_COST',
  INSTALLATION_DAYS = 'INSTALLATION_DAYS',
  FLOOR_AREA = 'FLOOR_AREA',
  CANDIDATES = 'CANDIDATES',
}

registerEnumType(LimitMeasure, {
  name: 'LimitMeasure',
  description:
    'What a limit adds up: yearly running cost less that of the replaced unit, days, square metres, or candidates.',
});

@ObjectType({ description: 'Between what a round’s purchases together must stay, beside its ceiling.' })
@Entity('round_limit')
export class Limit {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  roundId: string;

  @Field()
  @Column('text')
  name: string;

  @Field(() => LimitMeasure)
  @Column('text')
  measure: LimitMeasure;

  @Column('uuid', { nullable: true })
  siteId: string | null;

  @Field(() => DecimalScalar, { nullable: true, description: 'In the organisation’s currency, days or m².' })
  @Column('numeric', { nullable: true })
  least: string | null;

  @Field(() => DecimalScalar, { nullable: true })
  @Column('numeric', { nullable: true })
  most: string | null;

  @Field(() => Int)
  @VersionColumn()
  version: number;
}
