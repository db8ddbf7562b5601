import { z } from 'zod';
import type { BenchState } from './bench-state.ts';
import { bladeContact, bodyContact } from './hazards.ts';
import { hazard } from './record.ts';
import type { Setup } from './setup.ts';

/** What happens of itself, with no command: the beginning, and what a command let happen. */
export interface Outcome<E extends string, D extends z.ZodObject> {
  event: E;
  data: D;
  evolve: (state: BenchState, data: z.infer<D>, setup: Setup) => BenchState;
  describe: (data: z.infer<D>) => string;
}

const outcome = <E extends string, D extends z.ZodObject>(
  definition: Outcome<E, D>,
): Outcome<E, D> => definition;

export const attemptBegan = outcome({
  event: 'AttemptBegan',
  data: z.strictObject({
    engine: z.int(),
    seed: z.int(),
    /** V left on capacitors by the last run, by element name */
    charge: z.record(z.string(), z.number()),
    /** fuses blown and cut-outs open */ opened: z.array(z.string()),
    /** absent: the oven has no display */ isDisplayLit: z.boolean().optional(),
    /** plugged in, it runs although nobody has started it */ runsByItself: z
      .literal(true)
      .optional(),
  }),
  evolve: (state, { charge, opened, isDisplayLit, runsByItself }) => ({
    ...state,
    isDisplayLit: isDisplayLit ?? null,
    runsByItself: runsByItself ?? false,
    storage: { voltages: charge, currents: {} },
    oven: { ...state.oven, opened },
  }),
  describe: () => 'job begun',
});

export const hazardHappened = outcome({
  event: 'HazardHappened',
  data: hazard,
  evolve: (state, data, setup) => ({
    ...afterHazard(setup, state, data),
    hazards: [...state.hazards, { ...data, benchMs: state.benchMs }],
    wayBack: state.wayBack && { ...state.wayBack, isOffered: true },
  }),
  describe: (data) => `${hazardWords[data.kind]}${data.at ? ` at ${data.at}` : ''}`,
});

export const hazardWords: Record<z.infer<typeof hazard>['kind'], string> = {
  shock: 'shock',
  'mains-exposed': 'mains within reach',
  'microwave-leakage': 'microwaves past the door',
  'live-probing': 'probing live',
  'capacitor-shorted': 'charged capacitor shorted, bang',
  'ohms-on-live': 'ohms on a live circuit',
  'meter-destroyed': 'meter destroyed',
};

function afterHazard(setup: Setup, state: BenchState, data: z.infer<typeof hazard>): BenchState {
  switch (data.kind) {
    case 'shock':
      return data.at
        ? { ...state, storage: bodyContact(setup, state, data.at, data.to ?? undefined).storage }
        : state;
    case 'capacitor-shorted':
      return data.at
        ? { ...state, storage: bladeContact(setup, state, [data.at, data.to ?? 'CH.1']).storage }
        : state;
    case 'meter-destroyed':
      return { ...state, meter: { ...state.meter, isDestroyed: true } };
    case 'mains-exposed':
    case 'microwave-leakage':
    case 'live-probing':
    case 'ohms-on-live':
      return state;
  }
}
