import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { BenchCommand } from '../../../shared/bench/catalogue.ts';
import { formatQuantity } from '../../../shared/engine/quantities/format-quantity.ts';
import type { OvenDefinition, OvenPart } from '../../../shared/oven/oven.ts';
import { partKinds } from '../../../shared/oven/parts/catalogue.ts';
import { sparesOf } from '../../../shared/oven/spares.ts';
import { describeTarget, liftedEnds, terminalsOf } from '../../../shared/oven/targets.ts';
import type { Selection } from '../../simulation/bench-store.ts';
import type { Hand } from '../tools/tool.ts';
import { holdChoices } from './hold-words.ts';
import { seatedEnds } from './seated-ends.ts';

/** One thing that can be done with what is picked out. */
export type Choice =
  | {
      kind: 'command';
      label: string;
      /** what stands on the button under a title that says the rest; it begins the label */ short?: string;
      command: BenchCommand;
    }
  | { kind: 'take'; label: string; hand: Hand }
  /** asks for the text of the tag first */
  | { kind: 'label'; label: string; end: string; text: string }
  | { kind: 'go'; label: string; to: Selection };

export interface ChoiceGroup {
  title: string;
  choices: readonly Choice[];
}

export interface Choices {
  /** `C1.2` */ ref: string;
  /** in words */ name: string;
  groups: readonly ChoiceGroup[];
}

/** What can be done with what is picked out, the likeliest first; null when it is no longer there. */
export function choicesFor(
  definition: OvenDefinition,
  state: BenchState,
  selection: Selection,
): Choices | null {
  switch (selection.kind) {
    case 'target':
      return targetChoices(definition, state, selection.ref);
    case 'part':
      return partChoices(definition, state, selection.ref);
    case 'lead':
      return leadChoices(definition, state, selection.ref);
  }
}

function targetChoices(definition: OvenDefinition, state: BenchState, ref: string): Choices | null {
  const name = describeTarget(definition, ref);
  const isEnd = ref in state.oven.leadEnds;
  // A connector that was refitted hides its metal.
  if (name === null || (isEnd && state.oven.leadEnds[ref] !== null)) return null;
  const terminal = terminalsOf(definition).find((one) => one.ref === ref);
  const groups: ChoiceGroup[] = [
    {
      title: 'Put here or take off',
      choices: [
        probeChoice(state, 'red', ref),
        probeChoice(state, 'black', ref),
        ...toolChoices(state, ref),
      ],
    },
    ...holdGroups(state, ref),
    {
      title: isEnd ? 'This lead end' : 'Leads here',
      choices: isEnd
        ? looseEndChoices(definition, state, ref)
        : [
            ...seatedEnds(state.oven, ref).flatMap((end) =>
              seatedEndChoices(definition, state, end),
            ),
            ...fitChoices(definition, state, ref),
          ],
    },
    {
      title: 'More',
      choices: [
        ...(terminal?.kind.isVarnished && !state.oven.cleaned.includes(ref)
          ? [command('Clean a spot with the pad', { type: 'CleanSpot', data: { terminal: ref } })]
          : []),
        { kind: 'take', label: 'Screwdriver blade here', hand: { kind: 'screwdriver', from: ref } },
        ...(terminal
          ? [
              {
                kind: 'go' as const,
                label: `Part ${terminal.part}`,
                to: { kind: 'part' as const, ref: terminal.part },
              },
            ]
          : []),
      ],
    },
  ];
  return { ref, name: name.replace(`${ref}, `, ''), groups: groups.filter(hasAny) };
}

const hasAny = ({ choices }: ChoiceGroup): boolean => choices.length > 0;
const command = (label: string, it: BenchCommand): Choice => ({
  kind: 'command',
  label,
  command: it,
});

/** `here`: it sits here already. */
const placing = (name: string, here: boolean, put: BenchCommand, take: BenchCommand): Choice =>
  here
    ? command(`${name} off`, take)
    : { kind: 'command', label: `${name} here`, short: name, command: put };

const probeChoice = (state: BenchState, probe: 'red' | 'black', target: string): Choice =>
  placing(
    probe === 'red' ? 'Red probe' : 'Black probe',
    state.probes[probe] === target,
    { type: 'PlaceProbe', data: { probe, target } },
    { type: 'RemoveProbe', data: { probe } },
  );

/** A probe that sits here, and how else it could be held. */
const holdGroups = (state: BenchState, target: string): ChoiceGroup[] =>
  (['red', 'black'] as const)
    .filter((probe) => state.probes[probe] === target)
    .map((probe) => ({
      title: `Hold the ${probe} probe`,
      choices: holdChoices
        .filter(([hold]) => hold !== state.holds[probe])
        .map(([hold, words]) => ({
          kind: 'command',
          label: `${words} for the ${probe} probe`,
          short: words,
          command: { type: 'HoldProbe', data: { probe, hold } },
        })),
    }));

const labelChoice = (state: BenchState, end: string, text: string): Choice => {
  const now = state.labels[end];
  return now === undefined
    ? { kind: 'label', label: `Label ${end}`, end, text }
    : { kind: 'label', label: `Change the label of ${end}`, end, text: now };
};

const leadName = (definition: OvenDefinition, end: string): string =>
  definition.leads.find(({ ref }) => ref === end.split('/')[0])?.name ?? end;

const seatedEndChoices = (definition: OvenDefinition, state: BenchState, end: string): Choice[] => [
  command(`Lift ${end}, ${leadName(definition, end)}`, { type: 'LiftLead', data: { end } }),
  labelChoice(state, end, state.oven.leadEnds[end] ?? end),
];

const looseEndChoices = (definition: OvenDefinition, state: BenchState, end: string): Choice[] => [
  ...homeOf(definition, end).map((terminal) =>
    command(`Refit on ${terminal}`, { type: 'RefitLead', data: { end, terminal } }),
  ),
  { kind: 'take', label: 'Take it to another terminal', hand: { kind: 'lead', end } },
  labelChoice(state, end, homeOf(definition, end)[0] ?? end),
];

const homeOf = (definition: OvenDefinition, end: string): string[] => {
  const [ref, side] = end.split('/');
  const lead = definition.leads.find((one) => one.ref === ref);
  return lead ? [lead.ends[side === 'a' ? 0 : 1]] : [];
};

/** Lifted ends could go on any terminal, also a wrong one; those that belong here come first. */
const fitChoices = (definition: OvenDefinition, state: BenchState, terminal: string): Choice[] =>
  liftedEnds(state.oven)
    .toSorted(
      (a, b) =>
        Number(homeOf(definition, b)[0] === terminal) -
        Number(homeOf(definition, a)[0] === terminal),
    )
    .map((end) =>
      command(
        `Fit ${end} here${state.labels[end] === undefined ? '' : `, labelled ${state.labels[end]}`}`,
        { type: 'RefitLead', data: { end, terminal } },
      ),
    );

function toolChoices({ discharge, battery }: BenchState, target: string): Choice[] {
  const tools = [
    placing(
      'Discharge clip',
      discharge.clip === target,
      { type: 'FitDischargeClip', data: { target } },
      { type: 'RemoveDischargeClip', data: {} },
    ),
    placing(
      'Discharge tip',
      discharge.tip === target,
      { type: 'TouchDischargeTip', data: { target } },
      { type: 'LiftDischargeTip', data: {} },
    ),
  ];
  const clips = (['neg', 'oneK'] as const).map((clip) =>
    placing(
      clip === 'neg' ? 'Battery −' : 'Battery + 1 kΩ',
      battery[clip] === target,
      { type: 'ClipBattery', data: { clip, target } },
      { type: 'UnclipBattery', data: { clip } },
    ),
  );
  return target.startsWith('BAT.') ? tools : [...tools, ...clips];
}

function partChoices(definition: OvenDefinition, state: BenchState, ref: string): Choices | null {
  const part = definition.parts.find((one) => one.ref === ref);
  if (!part) return null;
  const isPressed = state.oven.pressed.includes(ref);
  const { actuator } = partKinds[part.kind];
  const press: Choice[] = !actuator
    ? []
    : [
        isPressed
          ? command(actuator.letGo, { type: 'ReleaseSwitch', data: { part: ref } })
          : command(actuator.hold, { type: 'PressSwitch', data: { part: ref } }),
      ];
  const groups: ChoiceGroup[] = [
    {
      title: 'This part',
      choices: [
        command('Look at it from close', { type: 'InspectPart', data: { part: ref } }),
        ...press,
        ...(part.kind === 'chassis'
          ? [command('Set, clean and seal the door', { type: 'RepairDoor', data: {} })]
          : replacements(part)),
      ],
    },
    {
      title: 'Its terminals',
      choices: terminalsOf(definition)
        .filter((one) => one.part === ref)
        .map((one) => ({
          kind: 'go' as const,
          label: `${one.ref}, ${one.kind.name}`,
          to: { kind: 'target' as const, ref: one.ref },
        })),
    },
  ];
  return { ref, name: part.name, groups: groups.filter(hasAny) };
}

/** Which size belongs here says the oven's own label, not this list. */
function replacements(part: OvenPart): Choice[] {
  const spares = sparesOf(part);
  const data = { part: part.ref };
  if (!spares) return [command('Replace it with a new one', { type: 'ReplacePart', data })];
  return spares.sizes.map((size) =>
    command(`Replace it: ${formatQuantity(size, spares.unit)}`, {
      type: 'ReplacePart',
      data: { ...data, size },
    }),
  );
}

function leadChoices(definition: OvenDefinition, state: BenchState, ref: string): Choices | null {
  const lead = definition.leads.find((one) => one.ref === ref);
  if (!lead) return null;
  const groups = (['a', 'b'] as const).map((side, i): ChoiceGroup => {
    const end = `${ref}/${side}`;
    const seat = state.oven.leadEnds[end] ?? null;
    return seat === null
      ? {
          title: `${end}, lifted, end for ${lead.ends[i]}`,
          choices: looseEndChoices(definition, state, end),
        }
      : {
          title: `${end}, on ${seat}`,
          choices: [
            command(`Lift ${end} off ${seat}`, { type: 'LiftLead', data: { end } }),
            labelChoice(state, end, seat),
          ],
        };
  });
  const repair = command('Give it new connectors', { type: 'RepairLead', data: { lead: ref } });
  return { ref, name: lead.name, groups: [...groups, { title: 'This lead', choices: [repair] }] };
}
