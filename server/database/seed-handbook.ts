import { createHash } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { System } from './entities/system';
import { SystemConstant } from './entities/system-constant';
import { SystemRevision } from './entities/system-revision';
import { handbook, type HandbookEntry } from './handbook/handbook';
import { termsOf } from './search-terms';

interface Change {
  readonly entry: HandbookEntry;
  readonly revision: number;
  readonly digest: Buffer;
}

const sorted = (_key: string, value: unknown) =>
  typeof value === 'object' && value !== null && !Array.isArray(value)
    ? Object.fromEntries(Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)))
    : value;

/** SHA-256 of all that an entry says, in whatever order it says it. */
const digestOf = (entry: HandbookEntry) =>
  createHash('sha256').update(JSON.stringify(entry, sorted)).digest();

async function changesIn(
  manager: EntityManager,
  entries: readonly HandbookEntry[],
): Promise<Change[]> {
  const present = await manager.query<{ id: string; revision: number; digest: Buffer }[]>(
    `SELECT s.id, s.revision, r.digest FROM systems s
     JOIN system_revisions r ON r.system_id = s.id AND r.revision = s.revision
     WHERE s.organization_id IS NULL`,
  );
  const known = new Map(present.map((row) => [row.id, row]));
  return entries.flatMap((entry) => {
    const before = known.get(entry.id);
    const digest = digestOf(entry);
    const isSame = before?.digest.equals(digest) ?? false;
    return isSame ? [] : [{ entry, revision: (before?.revision ?? 0) + 1, digest }];
  });
}

const constantsOf = ({ entry, revision }: Change) =>
  entry.determinations.flatMap(({ listedAs, constants }, index) =>
    constants.map((constant) => ({
      ...constant,
      systemId: entry.id,
      revision,
      determination: index + 1,
      listedAs,
    })),
  );

async function write(manager: EntityManager, changes: readonly Change[]): Promise<void> {
  const into = (entity: typeof System | typeof SystemRevision | typeof SystemConstant) =>
    manager.createQueryBuilder().insert().into(entity);
  await into(System)
    .values(
      changes.map(({ entry: { id, name }, revision }) => ({
        id,
        organizationId: null,
        revision,
        sortName: name.toLowerCase(),
      })),
    )
    .orUpdate(['revision', 'sort_name'], ['id'])
    .execute();
  await into(SystemRevision)
    .values(
      changes.map(({ entry, revision, digest }) => ({
        systemId: entry.id,
        revision,
        name: entry.name,
        aliases: entry.aliases,
        formula: entry.formula,
        cas: entry.cas,
        note: entry.note,
        fullyProtonatedCharge: entry.fullyProtonatedCharge,
        species: entry.species.map(({ formula }) => formula ?? null),
        digest,
      })),
    )
    .execute();
  await into(SystemConstant).values(changes.flatMap(constantsOf)).execute();
}

/** Terms follow from the entries: those that are missing come, those that no longer hold go. */
async function writeTerms(
  manager: EntityManager,
  entries: readonly HandbookEntry[],
): Promise<void> {
  const terms = entries.flatMap((entry) =>
    termsOf(entry).map((term) => ({ id: entry.id, ...term })),
  );
  const wanted = `json_to_recordset($1) AS wanted (id text, kind text, term text)`;
  const parameters = [JSON.stringify(terms)];
  await manager.query(
    `DELETE FROM system_terms t USING systems s
     WHERE s.id = t.system_id AND s.organization_id IS NULL AND NOT EXISTS (
       SELECT FROM ${wanted} WHERE (id, kind, term) = (t.system_id, t.kind, t.term))`,
    parameters,
  );
  await manager.query(
    `INSERT INTO system_terms (system_id, kind, term) SELECT id, kind, term FROM ${wanted}
     ON CONFLICT DO NOTHING`,
    parameters,
  );
}

/**
 * Brings the handbook in the database to what its sources say: an entry that says something else
 * gets a new revision, the others stay as they are. Answers how many changed.
 */
export async function seedHandbook(
  database: DataSource,
  entries: readonly HandbookEntry[] = handbook(),
): Promise<number> {
  return database.transaction(async (manager) => {
    const changes = await changesIn(manager, entries);
    if (changes.length > 0) await write(manager, changes);
    await writeTerms(manager, entries);
    return changes.length;
  });
}
