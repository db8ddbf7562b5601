import { useFormContext } from 'react-hook-form';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { TextArea } from '../../../components/text-area.tsx';
import { TextField } from '../../../components/text-field.tsx';

export const TicketFields = () => {
  const { register, formState } = useFormContext<ScenarioContent>();
  const errors = formState.errors.ticket;
  return (
    <section aria-labelledby="ticket" className="grid gap-4">
      <h2 id="ticket" className="text-xl font-bold">
        Job ticket
      </h2>
      <TextArea
        label="Complaint"
        hint="In the customer's own words, without quotation marks."
        rows={2}
        error={errors?.complaint?.message}
        {...register('ticket.complaint')}
      />
      <TextField
        label="Age and use"
        hint="For example: 6 years, canteen use."
        error={errors?.age?.message}
        {...register('ticket.age')}
      />
      <TextArea
        label="History"
        hint="Earlier repairs, storms, moves."
        error={errors?.history?.message}
        {...register('ticket.history')}
      />
      <TextArea
        label="Seen at site"
        hint="What whoever took the call saw and heard."
        error={errors?.seenAtSite?.message}
        {...register('ticket.seenAtSite')}
      />
    </section>
  );
};
