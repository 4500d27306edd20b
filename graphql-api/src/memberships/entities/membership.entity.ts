import { Field, ID, ObjectType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';
import { Role } from '../role.enum.js';

@ObjectType()
@Entity('membership')
export class Membership {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  userId: string;

  @Field()
  @Column('text')
  name: string;

  @Column('text')
  email: string;

  @Field()
  @Column('text')
  title: string;

  @Field(() => [Role])
  @Column('text', { array: true })
  roles: Role[];

  @Column('uuid', { nullable: true })
  departmentId: string | null;

  @Column('boolean')
  active: boolean;
}
