import { z } from 'zod';
import { partRef } from '../../oven/oven.ts';
import { partKinds } from '../../oven/parts/catalogue.ts';
import { accept, action, refuse } from '../action.ts';
import { insideRefusal } from '../reach.ts';

const onPart = z.strictObject({ part: partRef });

export const pressSwitch = action({
  command: 'PressSwitch',
  event: 'SwitchPressed',
  input: onPart,
  data: onPart,
  decide: (bench, { part }) => {
    const definition = bench.setup.oven.definition.parts.find((one) => one.ref === part);
    if (!definition || !partKinds[definition.kind].actuator) {
      return refuse('no-actuator', `${part} has nothing to hold or turn by hand.`);
    }
    if (bench.state.oven.pressed.includes(part)) {
      return refuse('pressed-already', `${part} is held already.`);
    }
    return insideRefusal(bench) ?? accept({ part });
  },
  evolve: (state, { part }) => ({
    ...state,
    oven: { ...state.oven, pressed: [...state.oven.pressed, part] },
  }),
  describe: ({ part }) => `${part} held by hand`,
});

export const releaseSwitch = action({
  command: 'ReleaseSwitch',
  event: 'SwitchReleased',
  input: onPart,
  data: onPart,
  decide: ({ state }, { part }) =>
    state.oven.pressed.includes(part)
      ? accept({ part })
      : refuse('not-pressed', `${part} is not held.`),
  evolve: (state, { part }) => ({
    ...state,
    oven: { ...state.oven, pressed: state.oven.pressed.filter((one) => one !== part) },
  }),
  describe: ({ part }) => `${part} let go`,
});
