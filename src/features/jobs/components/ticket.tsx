import type { Job } from '../../../../shared/contracts/scenarios.ts';
import { JobTag } from '../../../components/job-tag.tsx';

/** A job's ticket as it hangs on the oven. */
export const Ticket = ({ job: { ticket, oven } }: { job: Job }) => (
  <JobTag
    complaint={ticket.complaint}
    rows={[
      { label: 'Unit', value: `${oven.maker} ${oven.model}` },
      { label: 'Supply', value: oven.supply },
      { label: 'Age', value: ticket.age },
      { label: 'History', value: ticket.history },
      { label: 'Seen at site', value: ticket.seenAtSite },
    ]}
  />
);
