import {
  createScenario,
  getJob,
  getScenario,
  listJobs,
  listScenarios,
  publishScenario,
  saveScenario,
} from '../../shared/contracts/scenarios.ts';
import { route, type ApiRoute } from '../http/api-route.ts';
import type { JobsService } from './jobs-service.ts';
import type { ScenariosService } from './scenarios-service.ts';

export function scenariosRoutes(scenarios: ScenariosService, jobs: JobsService): ApiRoute[] {
  return [
    route(listJobs, 'member', ({ caller }) => jobs.list(caller.member)),
    route(getJob, 'member', ({ caller, params }) => jobs.get(caller.member, params.scenario)),
    route(listScenarios, 'instructor', ({ caller }) => scenarios.list(caller.member)),
    route(createScenario, 'instructor', ({ caller, body }) =>
      scenarios.create(caller.member, body.draft),
    ),
    route(getScenario, 'instructor', ({ caller, params }) =>
      scenarios.get(caller.member, params.scenario),
    ),
    route(saveScenario, 'instructor', ({ caller, params, body }) =>
      scenarios.save(caller.member, params.scenario, body.draft),
    ),
    route(publishScenario, 'instructor', ({ caller, params }) =>
      scenarios.publish(caller.member, params.scenario),
    ),
  ];
}
