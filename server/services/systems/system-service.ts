import type { DataSource } from 'typeorm';
import type { StoredSystem, SystemSummary } from '../../../shared/stored-system';
import { SystemConstant } from '../../database/entities/system-constant';
import { SystemRevision } from '../../database/entities/system-revision';
import { Refusal } from '../../refusal';
import { readReference, type Reference } from './reference';
import { searchSystems, type Page, type Place, type Reader } from './search-systems';
import { storedSystemOf, summaryOf } from './stored-system';

interface Found {
  readonly items: SystemSummary[];
  /** Where the page ends; undefined where it is the last. */
  readonly last: Place | undefined;
}

/** The handbook and the organizations' own systems. */
export class SystemService {
  constructor(private readonly database: DataSource) {}

  /** A page of the systems that a query finds, best matches first; of all, by name, without one. */
  async list(reader: Reader, page: Page): Promise<Found> {
    const places = await searchSystems(this.database, reader, page);
    const here = places.slice(0, page.limit);
    const systems = await this.find(
      reader,
      here.map(({ id }) => id),
    );
    return {
      items: here.flatMap(({ id }) => systems.get(id) ?? []).map(summaryOf),
      last: places.length > page.limit ? here.at(-1) : undefined,
    };
  }

  /** One system with all that is known of it. Refused with `not-found`; another's, too. */
  async read(reader: Reader, id: string): Promise<StoredSystem> {
    const found = (await this.find(reader, [id])).get(id);
    if (!found) throw new Refusal('not-found', `There is no system ${id}.`);
    return found;
  }

  /** Of the systems named ("tris", "tris@2"), those that the reader may see, by what was written. */
  async find(reader: Reader, written: readonly string[]): Promise<Map<string, StoredSystem>> {
    const references = new Map(written.map((text) => [text, readReference(text)]));
    const rows = await this.revisions(reader, [...references.values()]);
    const found = [...references].flatMap(([text, { id, revision }]) => {
      const row = rows.find(
        (one) => one.systemId === id && one.revision === (revision ?? one.system?.revision),
      );
      return row ? [[text, storedSystemOf(row)] as const] : [];
    });
    return new Map(found);
  }

  /** The present revisions of these systems, and any of the numbers named. */
  private async revisions(
    reader: Reader,
    references: readonly Reference[],
  ): Promise<SystemRevision[]> {
    if (references.length === 0) return [];
    return this.database
      .getRepository(SystemRevision)
      .createQueryBuilder('entry')
      .innerJoinAndSelect('entry.system', 'system')
      .innerJoinAndMapMany(
        'entry.constants',
        SystemConstant,
        'constant',
        'constant.systemId = entry.systemId AND constant.revision = entry.revision',
      )
      .where('entry.systemId IN (:...ids)', { ids: references.map(({ id }) => id) })
      .andWhere('(system.organizationId IS NULL OR system.organizationId = :reader)', {
        reader: reader ?? null,
      })
      .andWhere('(entry.revision = system.revision OR entry.revision IN (:...revisions))', {
        revisions: [0, ...references.flatMap(({ revision }) => revision ?? [])],
      })
      .orderBy('constant.determination')
      .addOrderBy('constant.step')
      .getMany();
  }
}
