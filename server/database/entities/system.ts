import { Column, Entity, PrimaryColumn } from 'typeorm';

/** A stored system: whose it is and which revision it is at. */
@Entity('systems')
export class System {
  @PrimaryColumn('text')
  id!: string;

  /** Null: the handbook, which everybody reads. */
  @Column('uuid', { name: 'organization_id', nullable: true })
  organizationId!: string | null;

  @Column('integer')
  revision!: number;

  /** The present name as lists are sorted by it. */
  @Column('text', { name: 'sort_name' })
  sortName!: string;
}
