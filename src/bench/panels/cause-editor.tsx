import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { SelectField } from '../../components/select-field.tsx';
import { useBench } from '../../simulation/bench-context.ts';
import { causeText, faultChoices } from './cause-choices.ts';
import { IconX } from './icon-x.tsx';
import { PanelSection } from './panel-section.tsx';

/** The record takes at most this many. */
const most = 4;

/** What was wrong: a part or lead, and how. */
export const CauseEditor = () => {
  const definition = useBench(({ setup }) => setup.oven.definition);
  const causes = useBench(({ state }) => state.sheet.causes);
  const run = useBench((store) => store.run);
  const [on, setOn] = useState('');
  const [fault, setFault] = useState('');
  const state = (next: typeof causes): boolean =>
    run({ type: 'StateCause', data: { causes: [...next] } });
  const add = (): void => {
    if (state([...causes, { on, fault }])) {
      setOn('');
      setFault('');
    }
  };
  const isThere = causes.some((one) => one.on === on && one.fault === fault);
  return (
    <PanelSection title="Cause">
      {causes.length > 0 ? (
        <ul className="grid gap-1">
          {causes.map((cause) => (
            <li
              key={`${cause.on} ${cause.fault}`}
              className="flex items-center justify-between gap-2 rounded bg-danger-tint pl-2 text-sm font-semibold text-danger"
            >
              {causeText(definition, cause)}
              <IconX
                name={`Take back: ${causeText(definition, cause)}`}
                onPress={() => state(causes.filter((one) => one !== cause))}
              />
            </li>
          ))}
        </ul>
      ) : null}
      {causes.length < most ? (
        <div className="grid gap-2">
          <SelectField
            label="Part or lead"
            value={on}
            onChange={(event) => {
              setOn(event.target.value);
              setFault('');
            }}
          >
            <option value="">choose</option>
            <optgroup label="Parts">
              {definition.parts
                .filter((part) => faultChoices(definition, part.ref).length > 0)
                .map(({ ref, name }) => (
                  <option key={ref} value={ref}>
                    {ref} {name}
                  </option>
                ))}
            </optgroup>
            <optgroup label="Leads">
              {definition.leads.map(({ ref, name }) => (
                <option key={ref} value={ref}>
                  {ref} {name}
                </option>
              ))}
            </optgroup>
          </SelectField>
          {on === '' ? null : (
            <>
              <SelectField
                label="What is wrong with it"
                value={fault}
                onChange={(event) => setFault(event.target.value)}
              >
                <option value="">choose</option>
                {faultChoices(definition, on).map(({ id, name }) => (
                  <option key={id} value={id}>
                    {name}
                  </option>
                ))}
              </SelectField>
              <Button isSmall disabled={fault === '' || isThere} onClick={add}>
                State this cause
              </Button>
            </>
          )}
        </div>
      ) : null}
    </PanelSection>
  );
};
