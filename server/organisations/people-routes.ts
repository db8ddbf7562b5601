import { changeRole, listPeople, type Person } from '../../shared/contracts/people.ts';
import { route, type ApiRoute } from '../http/api-route.ts';
import { done, refused } from '../outcome.ts';
import type { PeopleStore, PersonLine } from './people.ts';

const presentPerson = (line: PersonLine): Person => ({
  id: line.id,
  name: line.name,
  email: line.email,
  role: line.role,
  joinedAt: line.joinedAt.toISOString(),
  attempts: line.attempts,
});

export function peopleRoutes(people: PeopleStore): ApiRoute[] {
  return [
    route(listPeople, 'administrator', async ({ caller }) => {
      const lines = await people.list(caller.member.organisation.id);
      return done({ people: lines.map(presentPerson) });
    }),
    route(changeRole, 'administrator', async ({ caller, params, body }) => {
      const { organisation } = caller.member;
      const change = await people.changeRole(organisation.id, params.person, body.role);
      switch (change.kind) {
        case 'changed':
          return done({ person: presentPerson(change.person) });
        case 'last-administrator':
          return refused(
            'not-allowed',
            `${organisation.name} would have no administrator left. Make somebody else one first.`,
          );
        case 'not-found':
          return refused('not-found', 'There is no such person in this organisation.');
      }
    }),
  ];
}
