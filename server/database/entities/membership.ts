import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import type { Role } from '../../../shared/scopes';
import { Organization } from './organization';
import { Person } from './person';

/** A person's place in an organization. */
@Entity('memberships')
export class Membership {
  @PrimaryColumn('uuid', { name: 'person_id' })
  personId!: string;

  @PrimaryColumn('uuid', { name: 'organization_id' })
  organizationId!: string;

  @Column('text')
  role!: Role;

  @ManyToOne(() => Person)
  @JoinColumn({ name: 'person_id' })
  person?: Relation<Person>;

  @ManyToOne(() => Organization)
  @JoinColumn({ name: 'organization_id' })
  organization?: Relation<Organization>;
}
