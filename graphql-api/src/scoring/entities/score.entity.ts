import { Field, ID, Int, ObjectType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';

@ObjectType({ description: 'What one assessor gives a candidate on one criterion.' })
@Entity('score')
export class Score {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Field(() => ID)
  @Column('uuid')
  candidateId: string;

  @Field(() => ID)
  @Column('uuid')
  criterionId: string;

  @Field(() => ID)
  @Column('uuid')
  membershipId: string;

  @Field(() => Int, { nullable: true, description: '0 to 100; empty when the assessor cannot judge.' })
  @Column('int', { nullable: true })
  points: number | null;

  @Field()
  @Column('boolean')
  cannotJudge: boolean;

  @Field()
  @Column('text')
  reason: string;

  @Field(() => Int)
  @Column('int')
  version: number;
}
