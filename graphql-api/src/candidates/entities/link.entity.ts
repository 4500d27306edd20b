import { Field, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn, VersionColumn } from 'typeorm';

export enum LinkKind {
  NEEDS = 'NEEDS',
  EITHER_OR = 'EITHER_OR',
  COUNT = 'COUNT',
}

registerEnumType(LinkKind, {
  name: 'LinkKind',
  description:
    'NEEDS: the candidate needs at least one member. EITHER_OR: at most one member. COUNT: between least and most members.',
});

@ObjectType({ description: 'A bond between candidates that every portfolio keeps.' })
@Entity('link')
export class Link {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  roundId: string;

  @Field(() => LinkKind)
  @Column('text')
  kind: LinkKind;

  @Column('uuid', { nullable: true })
  candidateId: string | null;

  @Field(() => Int, { nullable: true })
  @Column('int', { nullable: true })
  least: number | null;

  @Field(() => Int, { nullable: true })
  @Column('int', { nullable: true })
  most: number | null;

  @Field()
  @Column('text')
  reason: string;

  @Field(() => Int)
  @VersionColumn()
  version: number;
}
