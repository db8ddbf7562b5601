import type { EntityManager } from 'typeorm';
import type { ScenarioLine } from './scenario.ts';

const sql = `
  SELECT scenario.id, scenario.number, scenario.draft, newest.version AS published,
         newest.content IS DISTINCT FROM scenario.draft AS "hasUnpublishedChanges",
         scenario.updated_at AS "updatedAt",
         (SELECT count(*)::integer FROM attempt
           WHERE attempt.scenario_id = scenario.id
             AND attempt.organisation_id = scenario.organisation_id
             AND attempt.scenario_version_id IS NOT NULL) AS attempts
    FROM scenario
    LEFT JOIN LATERAL (
      SELECT version, content FROM scenario_version
       WHERE scenario_id = scenario.id ORDER BY version DESC LIMIT 1) AS newest ON true
   WHERE scenario.organisation_id = $1
   ORDER BY scenario.number`;

/** The scenarios of one organisation with their newest versions, in the order of their numbers. */
export const scenarioLines = (
  manager: EntityManager,
  organisation: string,
): Promise<ScenarioLine[]> => manager.query<ScenarioLine[]>(sql, [organisation]);
