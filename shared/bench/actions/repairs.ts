import { z } from 'zod';
import { leadRef } from '../../oven/oven.ts';
import { accept, action, refuse } from '../action.ts';
import { touch } from '../hazards.ts';
import { insideRefusal } from '../reach.ts';

const onLead = z.strictObject({ lead: leadRef });
const nothing = z.strictObject({});

/** New connectors, and a new conductor where it is broken. Where its ends sit stays as it is. */
export const repairLead = action({
  command: 'RepairLead',
  event: 'LeadRepaired',
  input: onLead,
  data: onLead,
  decide: (bench, { lead }) => {
    const { setup, state } = bench;
    if (!setup.oven.definition.leads.some(({ ref }) => ref === lead))
      return refuse('no-such-lead', `There is no lead ${lead}.`);
    const inside = insideRefusal(bench);
    if (inside) return inside;
    if (state.isCordIn) return refuse('cord-is-in', 'The cord is in. Pull it first.');
    const seats = [`${lead}/a`, `${lead}/b`].map((end) => state.oven.leadEnds[end] ?? end);
    return accept({ lead }, touch(setup, state, seats));
  },
  evolve: (state, { lead }) => ({
    ...state,
    oven: { ...state.oven, faults: state.oven.faults.filter(({ on }) => on !== lead) },
  }),
  describe: ({ lead }) => `${lead} given new connectors`,
});

/** Hinges set, frame cleaned, choke cover renewed: the door closes flat again. */
export const repairDoor = action({
  command: 'RepairDoor',
  event: 'DoorRepaired',
  input: nothing,
  data: nothing,
  decide: ({ state }) =>
    state.isCordIn ? refuse('cord-is-in', 'The cord is in. Pull it first.') : accept({}),
  evolve: (state, _data, { oven }) => {
    const isDoor = (ref: string): boolean =>
      oven.definition.parts.some((part) => part.ref === ref && part.kind === 'chassis');
    return {
      ...state,
      oven: { ...state.oven, faults: state.oven.faults.filter(({ on }) => !isDoor(on)) },
    };
  },
  describe: () => 'door set, cleaned and sealed',
});
