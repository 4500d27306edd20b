import { Column, Entity, PrimaryGeneratedColumn } from 'typeorm';

@Entity('link_member')
export class LinkMember {
  @PrimaryGeneratedColumn('uuid') id: string;
  @Column('uuid') linkId: string;
  @Column('uuid') candidateId: string;
}
