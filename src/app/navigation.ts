import type { Role } from '../../shared/contracts/fields.ts';

export interface Place {
  to: string;
  name: string;
}

const jobs: Place = { to: '/jobs', name: 'Jobs' };
const review: Place = { to: '/review', name: 'Review' };
const progress: Place = { to: '/progress', name: 'Progress' };

/** Where a role works, most used first; the first is where signing in leads. */
export const placesOf: Record<Role, readonly [Place, ...Place[]]> = {
  trainee: [jobs, progress],
  instructor: [{ to: '/scenarios', name: 'Scenarios' }, review, jobs, progress],
  administrator: [{ to: '/people', name: 'People' }, review, jobs, progress],
};

export const homeOf = (role: Role): string => placesOf[role][0].to;
