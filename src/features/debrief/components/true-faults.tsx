import type { AppliedFault } from '../../../../shared/oven/fault.ts';
import type { OvenDefinition } from '../../../../shared/oven/oven.ts';
import { faultName, partName } from '../part-name.ts';

interface Props {
  faults: readonly AppliedFault[];
  definition: OvenDefinition | undefined;
}

export const TrueFaults = ({ faults, definition }: Props) => (
  <section aria-labelledby="true-faults" className="grid content-start gap-3">
    <h2 id="true-faults" className="text-xl font-bold">
      What was truly wrong
    </h2>
    {faults.length === 0 ? (
      <p>Nothing: every part and lead of this oven was good.</p>
    ) : (
      <ul className="grid gap-2">
        {faults.map(({ on, fault }, index) => (
          <li key={index} className="rounded-md border border-line bg-sheet px-4 py-2.5">
            <strong>{partName(definition, on)}</strong>: {faultName(definition, on, fault)}
          </li>
        ))}
      </ul>
    )}
  </section>
);
