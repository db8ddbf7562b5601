import type { Attempt } from '../../../shared/contracts/attempts.ts';
import { JobTag } from '../../components/job-tag.tsx';
import { useBench } from '../../simulation/bench-context.ts';

/** The ticket as it hangs on this oven. */
export const JobTicket = ({ attempt }: { attempt: Attempt }) => {
  const definition = useBench(({ setup }) => setup.oven.definition);
  const { ticket } = attempt.content;
  const { volts, hertz, amps } = definition.supply;
  return (
    <JobTag
      complaint={ticket.complaint}
      rows={[
        { label: 'Unit', value: `${definition.maker} ${definition.model}, ${definition.type}` },
        { label: 'Supply', value: `${volts} V ${hertz} Hz, ${amps} A` },
        { label: 'Age', value: ticket.age },
        { label: 'History', value: ticket.history },
        { label: 'Seen at site', value: ticket.seenAtSite },
      ]}
    />
  );
};
