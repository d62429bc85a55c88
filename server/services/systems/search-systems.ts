import type { DataSource } from 'typeorm';
import { z } from 'zod';
import { systemId } from '../../../shared/system';
import { text } from '../../../shared/text';
import { queryTerms } from '../../database/search-terms';

/** Whose systems are seen: an organization's beside the handbook, or the handbook alone. */
export type Reader = string | undefined;

/** Where in a list a system stands: how well it matches, then its name, then its id. */
export const place = z.strictObject({
  rank: z.int().min(0).max(3),
  name: text(400),
  id: systemId,
});
export type Place = z.infer<typeof place>;

export interface Page {
  readonly query?: string | undefined;
  readonly limit: number;
  readonly after?: Place | undefined;
}

/**
 * How well a term matches: 0 the whole, 1 its beginning, 2 the beginning of a word in a name, 3 any
 * part of a name. Formulas and CAS numbers match from their beginning only.
 */
const rank = `
  CASE
    WHEN term = wanted THEN 0
    WHEN starts_with(term, wanted) THEN 1
    WHEN kind = 'name' AND position(' ' || wanted IN term) > 0 THEN 2
    WHEN kind = 'name' AND position(wanted IN term) > 0 THEN 3
  END`;

const found = `
  SELECT system_id AS id, min(${rank}) AS rank
  FROM system_terms
  JOIN json_each_text($2::json) AS by (of_kind, wanted) ON of_kind = kind AND wanted <> ''
  GROUP BY system_id HAVING min(${rank}) IS NOT NULL`;

const everything = `SELECT id, 0 AS rank FROM systems WHERE $2::json IS NULL`;

/**
 * Where the systems of a page stand, one beyond the page where there are more. The order depends on
 * nothing but the query and each system's own names, so that paging neither repeats nor skips when
 * systems come or go.
 */
export function searchSystems(
  database: DataSource,
  reader: Reader,
  { query, limit, after }: Page,
): Promise<Place[]> {
  return database.query<Place[]>(
    `WITH found AS (${query === undefined ? everything : found})
     SELECT rank, sort_name AS name, id FROM found JOIN systems USING (id)
     WHERE (organization_id IS NULL OR organization_id = $1)
       AND ($3::int IS NULL OR (rank, sort_name, id) > ($3, $4, $5))
     ORDER BY rank, sort_name, id LIMIT $6`,
    [
      reader ?? null,
      query === undefined ? null : JSON.stringify(queryTerms(query)),
      after?.rank ?? null,
      after?.name ?? null,
      after?.id ?? null,
      limit + 1,
    ],
  );
}
