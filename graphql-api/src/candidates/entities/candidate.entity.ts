import { Field, ID, Int, ObjectType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn, VersionColumn } from 'typeorm';
import { safeInteger } from '../../common/bigint.transformer.js';
import { DecimalScalar } from '../../common/scalars/decimal.scalar.js';
import { CandidateKind } from '../candidate-kind.enum.js';

/** What may be bought in a round. Amounts are gross in minor units of the organisation's currency, works net. */
@ObjectType({ description: 'What may be bought in a round.' })
@Entity('candidate')
export class Candidate {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  roundId: string;

  @Field()
  @Column('text')
  code: string;

  @Field()
  @Column('text')
  name: string;

  @Field()
  @Column('text')
  need: string;

  @Column('uuid')
  departmentId: string;

  @Column('uuid')
  siteId: string;

  @Field(() => CandidateKind)
  @Column('text')
  kind: CandidateKind;

  @Field({ description: 'What the thing is called whoever makes it.' })
  @Column('text')
  genericGroup: string;

  @Field(() => Int)
  @Column('int')
  quantity: number;

  @Field(() => Int)
  @Column('int')
  usefulLifeYears: number;

  @Field(() => DecimalScalar, {
    description: 'Of the net unit price, got back at the end of the useful life.',
  })
  @Column('numeric')
  residualPercent: string;

  @Column('bigint', { transformer: safeInteger })
  worksNetMinor: number;

  @Column('bigint', { transformer: safeInteger })
  consumablesYearlyMinor: number;

  @Column('bigint', { transformer: safeInteger })
  energyYearlyMinor: number;

  @Column('bigint', { transformer: safeInteger })
  currentRunningYearlyMinor: number;

  @Field(() => DecimalScalar)
  @Column('numeric')
  installationDays: string;

  @Field(() => DecimalScalar)
  @Column('numeric')
  floorAreaM2: string;

  @Field({ description: 'Bought whatever its benefit.' })
  @Column('boolean')
  mandatory: boolean;

  @Field()
  @Column('text')
  mandatoryReason: string;

  @Field(() => [String], { description: 'What the site must provide before installation.' })
  @Column('text', { array: true })
  siteNeeds: string[];

  @Column('uuid', { nullable: true })
  keptQuoteId: string | null;

  @Field({ description: 'Why a certain quote was kept. Empty while the round’s rule chooses.' })
  @Column('text')
  keptReason: string;

  @Field(() => Int)
  @VersionColumn()
  version: number;
}
