import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { describeTarget } from '../../../shared/oven/targets.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import type { BenchScene } from '../geometry/bench-scene.ts';
import { seatedEnds } from '../panels/seated-ends.ts';
import { holdWords } from '../panels/hold-words.ts';
import { targetWords } from '../panels/target-words.ts';

/** One thing on the bench that a tap can meet, as a button. */
export interface MirrorEntry {
  kind: 'target' | 'part' | 'lead';
  ref: string;
  /** `C1.2, high-voltage capacitor, diode side, red probe on it, lead W24 on it` */ name: string;
  /** what is seen of it in the list */ short: string;
  at: BenchPoint;
}

export interface MirrorGroup {
  id: string;
  title: string;
  entries: readonly MirrorEntry[];
}

/** Everything on the canvas that listens, group by group: the picture's other half. */
export function mirrorGroups(
  definition: OvenDefinition,
  state: BenchState,
  scene: BenchScene,
): MirrorGroup[] {
  const targets = scene.terminals.filter(({ isReachable }) => isReachable);
  const entry = (ref: string): MirrorEntry[] =>
    targets
      .filter(({ target }) => target === ref)
      .map(({ target, at }) => targetEntry(definition, state, target, at));
  const isOpen = !scene.isCoverOn;
  const drawn = definition.parts.flatMap(({ ref }) => scene.parts.filter((one) => one.ref === ref));
  const parts = drawn
    .filter(({ kind }) => kind !== 'chassis' || isOpen)
    .map((part): MirrorGroup => {
      const own = targets.filter(({ target }) => target.startsWith(`${part.ref}.`));
      const whole: MirrorEntry = {
        kind: 'part',
        ref: part.ref,
        name: `${part.ref}, ${part.name}`,
        short: part.name,
        at: [part.at[0] + part.size[0] / 2, part.at[1] + part.size[1] / 2],
      };
      return {
        id: part.ref,
        title: `${part.ref} ${part.name}`,
        entries: [
          ...(isOpen && part.kind !== 'chassis' ? [whole] : []),
          ...own.flatMap(({ target }) => entry(target)),
        ],
      };
    });
  const loose = targets.filter(({ state: is }) => is === 'loose-end');
  const groups: MirrorGroup[] = [
    ...parts,
    {
      id: 'loose',
      title: 'Lifted lead ends',
      entries: loose.flatMap(({ target }) => entry(target)),
    },
    {
      id: 'BAT',
      title: 'Battery',
      entries: targets
        .filter(({ target }) => target.startsWith('BAT.'))
        .flatMap(({ target }) => entry(target)),
    },
    { id: 'leads', title: 'Leads', entries: isOpen ? leadEntries(definition, state, scene) : [] },
  ];
  return groups.filter(({ entries }) => entries.length > 0);
}

function targetEntry(
  definition: OvenDefinition,
  state: BenchState,
  target: string,
  at: BenchPoint,
): MirrorEntry {
  const words = describeTarget(definition, target) ?? target;
  const marks = marksOn(state, target);
  return {
    kind: 'target',
    ref: target,
    name: [words.startsWith(target) ? words : `${target}, ${words}`, ...marks].join(', '),
    short: [targetWords(definition, state, target).short, ...marks].join(', '),
    at,
  };
}

/** What sits on a target now, in words. */
export function marksOn(
  { probes, holds, discharge, battery, oven, labels }: BenchState,
  target: string,
): string[] {
  const on = (is: boolean, words: string): string[] => (is ? [words] : []);
  const ends = seatedEnds(oven, target);
  const label = labels[target];
  return [
    ...on(probes.red === target, `red probe on it${holdWords[holds.red]}`),
    ...on(probes.black === target, `black probe on it${holdWords[holds.black]}`),
    ...on(discharge.clip === target, 'discharge clip on it'),
    ...on(discharge.tip === target, 'discharge tip on it'),
    ...on(battery.neg === target, 'battery negative on it'),
    ...on(battery.oneK === target, 'battery 1 kΩ on it'),
    ...on(label !== undefined, `labelled ${label}`),
    ...on(ends.length > 0, `${ends.map((end) => end.split('/')[0]).join(' and ')} on it`),
  ];
}

const leadEntries = (
  definition: OvenDefinition,
  { oven }: BenchState,
  scene: BenchScene,
): MirrorEntry[] =>
  scene.leads.flatMap((lead) => {
    const name = definition.leads.find(({ ref }) => ref === lead.ref)?.name;
    if (name === undefined) return [];
    const ends = (['a', 'b'] as const).map(
      (side) => oven.leadEnds[`${lead.ref}/${side}`] ?? 'lifted',
    );
    const words = `${name}, ${ends.join(' to ')}`;
    return [
      {
        kind: 'lead' as const,
        ref: lead.ref,
        name: `${lead.ref}, lead, ${words}`,
        short: words,
        at: lead.path[Math.floor(lead.path.length / 2)] ?? [0, 0],
      },
    ];
  });
