import { Field, ID, Int, ObjectType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn, VersionColumn } from 'typeorm';
import { Memo } from '../models/memo.model.js';
import { SelectionState } from '../selection-transitions.js';

@ObjectType({ description: 'A portfolio submitted for approval, with its memo frozen as it was.' })
@Entity('selection')
export class Selection {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  roundId: string;

  @Column('uuid')
  runId: string;

  @Field(() => Int)
  @Column('int')
  number: number;

  @Field(() => SelectionState)
  @Column('text')
  state: SelectionState;

  @Field(() => Memo)
  @Column('jsonb')
  memo: Memo;

  @Field({ description: 'SHA-256 of the memo.' })
  @Column('text')
  fingerprint: string;

  @Field({ description: 'Why this portfolio, in the submitter’s words.' })
  @Column('text')
  reason: string;

  @Column('uuid')
  submittedBy: string;

  @Field(() => Date)
  @Column('timestamptz')
  submittedAt: Date;

  @Column('uuid', { nullable: true })
  decidedBy: string | null;

  @Field(() => Date, { nullable: true })
  @Column('timestamptz', { nullable: true })
  decidedAt: Date | null;

  @Field()
  @Column('text')
  comment: string;

  @Field(() => Int)
  @VersionColumn()
  version: number;
}
