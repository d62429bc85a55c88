import type { DataSource } from 'typeorm';

/** Puts a monoprotic system of an organization's own into the database, named by its id. */
export async function insertOwnSystem(
  database: DataSource,
  organizationId: string,
  id: string,
): Promise<void> {
  const name = id.replaceAll('-', ' ');
  await database.transaction(async (manager) => {
    await manager.query(
      `INSERT INTO systems (id, organization_id, revision, sort_name) VALUES ($1, $2, 1, $3)`,
      [id, organizationId, name],
    );
    await manager.query(
      `INSERT INTO system_revisions
         (system_id, revision, name, aliases, fully_protonated_charge, species, digest)
       VALUES ($1, 1, $2, '{}', 0, '{NULL,NULL}', $3)`,
      [id, name, Buffer.alloc(32)],
    );
    await manager.query(
      `INSERT INTO system_constants (system_id, revision, determination, step, value, kind,
         temperature, ionic_strength, approximate, estimate, source, provenance)
       VALUES ($1, 1, 1, 1, 7.12, 'mixed', 20, 0.05, false, false, 'our bench book', 'stated')`,
      [id],
    );
    await manager.query(
      `INSERT INTO system_terms (system_id, kind, term) VALUES ($1, 'name', $2)`,
      [id, name],
    );
  });
}
