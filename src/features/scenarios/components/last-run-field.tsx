import { useController } from 'react-hook-form';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { Checkbox } from '../../../components/checkbox.tsx';
import { TextField } from '../../../components/text-field.tsx';

const soon = 30;

/** How long before the attempt the oven last ran: it decides how much charge the capacitor still has. */
export const LastRunField = () => {
  const {
    field: { ref: focusRef, value: seconds, onBlur, onChange },
    fieldState,
  } = useController<ScenarioContent, 'lastRunSecondsAgo'>({ name: 'lastRunSecondsAgo' });
  return (
    <div className="grid gap-3">
      <Checkbox
        label="The oven ran shortly before"
        checked={seconds !== null}
        onChange={({ target }) => onChange(target.checked ? soon : null)}
      />
      {seconds === null ? (
        <p className="text-sm text-ink-2">It has not run for days: the capacitor is empty.</p>
      ) : (
        <TextField
          ref={focusRef}
          label="Last run, seconds ago"
          hint="0 to 86400, a day. The sooner, the more charge is left in the capacitor."
          type="number"
          min={0}
          max={86_400}
          value={Number.isNaN(seconds) ? '' : seconds}
          onBlur={onBlur}
          onChange={({ target }) =>
            onChange(target.value === '' ? Number.NaN : target.valueAsNumber)
          }
          error={fieldState.error?.message}
        />
      )}
    </div>
  );
};
