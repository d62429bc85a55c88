import { Column, CreateDateColumn, Entity, PrimaryColumn } from 'typeorm';

/** Somebody who signs in; belongs to organizations by memberships. */
@Entity('people')
export class Person {
  @PrimaryColumn('uuid')
  id!: string;

  /** Unique without regard to case. */
  @Column('text')
  email!: string;

  @Column('text')
  name!: string;

  /** Argon2id; null for somebody who cannot sign in. Read only where it is asked for. */
  @Column('text', { name: 'password_hash', nullable: true, select: false })
  passwordHash!: string | null;

  @CreateDateColumn({ name: 'created_at', type: 'timestamptz' })
  createdAt!: Date;
}
