import { Field, ID, Int, ObjectType, registerEnumType } from '@nestjs/graphql';
import { Column, CreateDateColumn, Entity, PrimaryGeneratedColumn } from 'typeorm';
import { safeInteger } from '../../common/bigint.transformer.js';

export enum DocumentState {
  EXPECTED = 'EXPECTED',
  READY = 'READY',
}

registerEnumType(DocumentState, {
  name: 'DocumentState',
  description: 'EXPECTED until the uploaded file has been checked, READY from then on.',
});

@ObjectType({ description: 'A file about a candidate, often the paper behind a quote.' })
@Entity('document')
export class Document {
  @Field(() => ID)
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  candidateId: string;

  @Field(() => ID, { nullable: true })
  @Column('uuid', { nullable: true })
  quoteId: string | null;

  @Field(() => DocumentState)
  @Column('text')
  state: DocumentState;

  @Field()
  @Column('text')
  fileName: string;

  @Field()
  @Column('text')
  contentType: string;

  @Field(() => Int)
  @Column('bigint', { transformer: safeInteger })
  sizeBytes: number;

  @Field(() => String, { nullable: true, description: 'Fingerprint of the content, in hexadecimal.' })
  @Column('text', { nullable: true })
  sha256: string | null;

  @Column('uuid')
  uploadedBy: string;

  @Field(() => Date)
  @CreateDateColumn({ type: 'timestamptz' })
  createdAt: Date;
}
