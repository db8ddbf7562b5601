import type { EntityManager } from 'typeorm';
import type { PublishedScenario } from './scenario.ts';

// $1 organisation or null for practice alone, $2 one scenario or null for all. In the list a
// practice scenario gives way to the organisation's own copy of it, once that is published.
const sql = `
  SELECT scenario.id AS scenario, scenario.number, newest.id AS "versionId", newest.version,
         newest.content
    FROM scenario
    JOIN organisation ON organisation.id = scenario.organisation_id
    JOIN LATERAL (
      SELECT id, version, content FROM scenario_version
       WHERE scenario_id = scenario.id ORDER BY version DESC LIMIT 1) AS newest ON true
   WHERE (scenario.organisation_id = $1::uuid OR organisation.is_practice)
     AND ($2::uuid IS NULL OR scenario.id = $2::uuid)
     AND NOT ($2::uuid IS NULL AND organisation.is_practice AND EXISTS (
       SELECT 1 FROM scenario AS own JOIN scenario_version ON scenario_version.scenario_id = own.id
        WHERE own.organisation_id = $1::uuid AND own.id <> scenario.id
          AND own.origin = scenario.origin))
   ORDER BY organisation.is_practice, scenario.number`;

/** The newest versions that can be started, the organisation's own first. */
export const publishedScenarios = (
  manager: EntityManager,
  { organisation, scenario = null }: { organisation: string | null; scenario?: string | null },
): Promise<PublishedScenario[]> =>
  manager.query<PublishedScenario[]>(sql, [organisation, scenario]);
