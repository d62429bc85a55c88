import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';

/** A laboratory or company: everything stored belongs to one. */
@Entity('organizations')
export class Organization {
  @PrimaryColumn('uuid')
  id!: string;

  @Column('text')
  name!: string;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt!: Date;
}
