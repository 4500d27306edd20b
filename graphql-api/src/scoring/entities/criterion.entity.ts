import { Field, ID, Int, ObjectType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';

@ObjectType({ description: 'One thing that benefit is made of, scored from 0 to 100.' })
@Entity('criterion')
export class Criterion {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  roundId: string;

  @Field()
  @Column('text')
  name: string;

  @Field({ description: 'What 0 points mean.' })
  @Column('text')
  lowAnchor: string;

  @Field({ description: 'What 100 points mean.' })
  @Column('text')
  highAnchor: string;

  @Field(() => Int, { description: 'How much the step from low to high is worth beside the other criteria.' })
  @Column('int')
  swingWeight: number;

  @Column('int')
  position: number;
}
