import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';

/** A letter to a member, written together with the change it tells of and sent by a job afterwards. */
@Entity('letter')
export class Letter {
  @PrimaryGeneratedColumn('uuid') id: string;
  @Column('uuid') membershipId: string;
  @Column('text') subject: string;
  @Column('text') body: string;
  @Column('text') state: 'WAITING' | 'SENT';
  @Column('timestamptz', { nullable: true }) sentAt: Date | null;
}
