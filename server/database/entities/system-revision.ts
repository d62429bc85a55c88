import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { System } from './system';
import type { SystemConstant } from './system-constant';

/** What is said about a system at one revision. It never changes: a change makes another. */
@Entity('system_revisions')
export class SystemRevision {
  @PrimaryColumn('text', { name: 'system_id' })
  systemId!: string;

  @PrimaryColumn('integer')
  revision!: number;

  @Column('text')
  name!: string;

  @Column('text', { array: true })
  aliases!: string[];

  @Column('text', { nullable: true })
  formula!: string | null;

  @Column('text', { nullable: true })
  cas!: string | null;

  @Column('text', { nullable: true })
  note!: string | null;

  @Column('integer', { name: 'fully_protonated_charge' })
  fullyProtonatedCharge!: number;

  /** Formula of each form, fully protonated first. */
  @Column('text', { array: true })
  species!: (string | null)[];

  /** SHA-256 of all that the revision says. */
  @Column('bytea')
  digest!: Buffer;

  @ManyToOne(() => System)
  @JoinColumn({ name: 'system_id' })
  system?: Relation<System>;

  /** There where a query joins them. */
  constants?: SystemConstant[];
}
