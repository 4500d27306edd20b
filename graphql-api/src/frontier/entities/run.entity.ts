import { Field, Float, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import type { Problem } from '@metewand/frontier';
import { safeInteger } from '../../common/bigint.transformer.js';
import { CostAxis } from '../cost-axis.enum.js';
import type { RunInput, RunProgressRow, RunResultRow } from '../run-result.js';

export enum RunState {
  WAITING = 'WAITING',
  SEARCHING = 'SEARCHING',
  FINISHED = 'FINISHED',
  STOPPED = 'STOPPED',
  INFEASIBLE = 'INFEASIBLE',
  FAILED = 'FAILED',
}

registerEnumType(RunState, {
  name: 'RunState',
  description: 'STOPPED: ended by a member, who keeps what was found.',
});

/** A search over frozen figures. Its large columns are read only where they are asked for. */
@ObjectType({ description: 'A search for the portfolios that no other portfolio beats in benefit and cost.' })
@Entity('run')
export class Run {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  roundId: string;

  @Field(() => Int)
  @Column('int')
  number: number;

  @Field(() => CostAxis)
  @Column('text')
  costAxis: CostAxis;

  @Field(() => RunState)
  @Column('text')
  state: RunState;

  @Field(() => Int)
  @Column('int')
  seed: number;

  @Field(() => Float, { description: 'Portfolios that its local search may look at.' })
  @Column('bigint', { transformer: safeInteger })
  evaluations: number;

  @Field(() => Float, { description: 'Branches that its proof may look at.' })
  @Column('bigint', { transformer: safeInteger })
  effort: number;

  @Field({ description: 'SHA-256 of the frozen problem.' })
  @Column('text')
  fingerprint: string;

  @Field()
  @Column('boolean')
  stopRequested: boolean;

  /** Fencing number: rises with each worker that takes the run. */
  @Column('int')
  attempt: number;

  @Field(() => String, { nullable: true, description: 'Why it failed, in words.' })
  @Column('text', { nullable: true })
  failure: string | null;

  @Column('uuid')
  startedBy: string;

  @Field(() => Date)
  @Column('timestamptz')
  createdAt: Date;

  @Field(() => Date, { nullable: true })
  @Column('timestamptz', { nullable: true })
  startedAt: Date | null;

  @Field(() => Date, { nullable: true })
  @Column('timestamptz', { nullable: true })
  finishedAt: Date | null;

  @Column('jsonb', { select: false })
  problem: Problem;

  @Column('jsonb', { select: false })
  items: RunInput;

  @Column('jsonb', { nullable: true, select: false })
  progress: RunProgressRow | null;

  @Column('jsonb', { nullable: true, select: false })
  result: RunResultRow | null;
}
