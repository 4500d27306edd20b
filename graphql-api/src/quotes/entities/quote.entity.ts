import { Field, ID, Int, ObjectType } from '@nestjs/graphql';
import { Column, Entity, PrimaryGeneratedColumn, VersionColumn } from 'typeorm';
import { safeInteger } from '../../common/bigint.transformer.js';
import { CalendarDateScalar } from '../../common/scalars/calendar-date.scalar.js';

/** What a vendor asks for a candidate. Amounts are in minor units of the quote's own currency. */
@ObjectType({ description: 'What a vendor asks for a candidate, in the vendor’s currency.' })
@Entity('quote')
export class Quote {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  candidateId: string;

  @Column('uuid')
  vendorId: string;

  @Field({ description: 'The vendor’s own number.' })
  @Column('text')
  number: string;

  @Field(() => CalendarDateScalar)
  @Column('date')
  quoteDate: string;

  @Field(() => CalendarDateScalar, { description: 'Last day on which the quote holds.' })
  @Column('date')
  validUntil: string;

  @Column('char', { length: 3 })
  currency: string;

  @Field()
  @Column('boolean')
  pricesIncludeVat: boolean;

  @Column('bigint', { transformer: safeInteger })
  unitPriceMinor: number;

  @Field(() => Int)
  @Column('int')
  quantity: number;

  @Column('bigint', { transformer: safeInteger })
  deliveryMinor: number;

  @Column('bigint', { transformer: safeInteger })
  installationMinor: number;

  @Column('bigint', { transformer: safeInteger })
  trainingMinor: number;

  @Column('bigint', { transformer: safeInteger })
  discountMinor: number;

  @Field(() => Int)
  @Column('int')
  warrantyYears: number;

  @Field()
  @Column('text')
  serviceTier: string;

  @Column('bigint', { nullable: true, transformer: safeInteger })
  serviceYearlyMinor: number | null;

  @Field(() => Int)
  @Column('int')
  leadWeeks: number;

  @Field({ description: 'Incoterms rule, such as DAP.' })
  @Column('text')
  incoterm: string;

  @Field()
  @Column('text')
  namedPlace: string;

  @Field()
  @Column('text')
  paymentTerms: string;

  @Field(() => Int)
  @VersionColumn()
  version: number;
}
