import { Column, Entity, PrimaryColumn } from 'typeorm';
import type { Constant } from '../../../shared/constant';

/** One step of one determination; decimals are the text that was published. */
@Entity('system_constants')
export class SystemConstant implements Constant {
  @PrimaryColumn('text', { name: 'system_id' })
  systemId!: string;

  @PrimaryColumn('integer')
  revision!: number;

  /** Determinations in order: the first is the preferred one. */
  @PrimaryColumn('integer')
  determination!: number;

  @PrimaryColumn('integer')
  step!: number;

  @Column('text', { name: 'listed_as', nullable: true })
  listedAs!: string | null;

  @Column('numeric')
  value!: string;

  @Column('text')
  kind!: Constant['kind'];

  @Column('numeric')
  temperature!: string;

  @Column('numeric', { name: 'ionic_strength', nullable: true })
  ionicStrength!: string | null;

  @Column('numeric', { nullable: true })
  uncertainty!: string | null;

  @Column('numeric', { name: 'delta_h', nullable: true })
  deltaH!: string | null;

  @Column('numeric', { name: 'delta_cp', nullable: true })
  deltaCp!: string | null;

  @Column('boolean')
  approximate!: boolean;

  @Column('boolean')
  estimate!: boolean;

  @Column('text')
  source!: string;

  @Column('text')
  provenance!: Constant['provenance'];

  @Column('text', { name: 'provenance_note', nullable: true })
  provenanceNote!: string | null;
}
