import { Field, ID, ObjectType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';

@ObjectType()
@Entity('organisation')
export class Organisation {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Field()
  @Column('text')
  name: string;

  @Field({ description: 'ISO 4217; everything is compared in it.' })
  @Column('char', { length: 3 })
  currency: string;

  @Field({ description: 'BCP 47, for numbers and dates.' })
  @Column('text')
  locale: string;

  @Field({ description: 'IANA name; due dates are days of this zone.' })
  @Column('text')
  timeZone: string;

  @Field({ description: 'Invented data for trying the product.' })
  @Column('boolean')
  demo: boolean;
}
