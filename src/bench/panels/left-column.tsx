import type { Attempt } from '../../../shared/contracts/attempts.ts';
import { BenchLog } from './bench-log.tsx';
import { JobTicket } from './job-ticket.tsx';
import { ServiceData } from './service-data.tsx';

/** What the trainee is given, and what they did. */
export const LeftColumn = ({ attempt }: { attempt: Attempt }) => (
  <div className="grid min-h-0 content-start gap-5">
    <JobTicket attempt={attempt} />
    <BenchLog />
    <ServiceData />
  </div>
);
