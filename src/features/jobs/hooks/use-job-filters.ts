import { useSearchParams } from 'react-router-dom';
import { symptom } from '../../../../shared/scenario/scenario.ts';
import type { Job } from '../../../../shared/contracts/scenarios.ts';

export type FilterName = 'symptom' | 'level' | 'text';
const names: readonly FilterName[] = ['symptom', 'level', 'text'];

const contains = (job: Job, text: string): boolean =>
  [job.title, job.symptom, job.oven.maker, job.oven.model, job.oven.supply, job.ticket.complaint]
    .join(' ')
    .toLowerCase()
    .includes(text.trim().toLowerCase());

/** The filters of the job list, kept in the address so that a list can be sent and come back to. */
export const useJobFilters = () => {
  const [search, setSearch] = useSearchParams();
  const wanted = symptom.safeParse(search.get('symptom'));
  const values = {
    symptom: wanted.success ? wanted.data : '',
    level: /^[1-5]$/.test(search.get('level') ?? '') ? (search.get('level') ?? '') : '',
    text: search.get('text') ?? '',
  };

  const change = (changes: Partial<Record<FilterName, string>>): void =>
    setSearch(
      (before) => {
        const next = new URLSearchParams(before);
        for (const [name, value] of Object.entries(changes)) {
          if (value) next.set(name, value);
          else next.delete(name);
        }
        return next;
      },
      { replace: true, preventScrollReset: true },
    );

  const matches = (job: Job): boolean =>
    (values.symptom === '' || job.symptom === values.symptom) &&
    (values.level === '' || job.level === Number(values.level)) &&
    contains(job, values.text);

  return {
    values,
    matches,
    set: (name: FilterName, value: string): void => change({ [name]: value }),
    clear: (): void => change(Object.fromEntries(names.map((name) => [name, '']))),
  };
};
