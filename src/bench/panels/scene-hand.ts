import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { RunOutcome } from '../../../shared/bench/record.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import type { BenchHand } from '../geometry/bench-hand.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import type { Hand } from '../tools/tool.ts';
import { looksOf } from './looks-of.ts';
import { stampOf } from './stamp-of.ts';

export interface Watching {
  hand: Hand;
  handAt: BenchPoint | null;
  hovered: string | null;
  focused: string | null;
  hazardFlash: string | null;
  /** the run that is being looked at; null: the oven stands still */ run: RunOutcome | null;
}

const idle: Watching = {
  hand: { kind: 'empty' },
  handAt: null,
  hovered: null,
  focused: null,
  hazardFlash: null,
  run: null,
};

/** All of the picture that the oven's circuit does not decide. */
export function sceneHand(
  definition: OvenDefinition,
  state: BenchState,
  watching: Watching = idle,
): BenchHand {
  const { run } = watching;
  const ofKind = (
    kind: string,
    isOn: boolean,
    isOf: (variant?: string) => boolean = () => true,
  ): string[] =>
    definition.parts
      .filter((part) => isOn && part.kind === kind && isOf(part.variant))
      .map(({ ref }) => ref);
  const only = (wanted: string) => (variant?: string) => variant === wanted;
  const allBut = (unwanted: string) => (variant?: string) => variant !== unwanted;
  return {
    isCoverOn: state.isCoverOn,
    isCordIn: state.isCordIn,
    probes: state.probes,
    holds: state.holds,
    discharge: state.discharge,
    battery: state.battery,
    labels: state.labels,
    carrying: carrying(watching.hand),
    handAt: watching.handAt,
    hovered: watching.hovered,
    focused: watching.focused,
    looks: Object.fromEntries(state.inspected.map((ref) => [ref, looksOf(definition, state, ref)])),
    stamps: Object.fromEntries(
      definition.parts.map((part) => [part.ref, stampOf(part, definition)]),
    ),
    lit: [
      ...ofKind('lamp', run?.isLampLit ?? false, allBut('cooktop')),
      ...ofKind('lamp', run?.hood?.isLampLit ?? false, only('cooktop')),
      ...ofKind('control-board', run?.isDisplayLit ?? state.isDisplayLit ?? false),
    ],
    turning: [
      ...ofKind('mechanical-timer', run?.isTimerRunning ?? false),
      ...ofKind('motor', run?.isFanTurning ?? false, only('fan')),
      ...ofKind('motor', run?.isTurntableTurning ?? false, only('turntable')),
      ...ofKind('motor', run?.hood?.isVentTurningHigh ?? false, only('vent-fan')),
    ],
    replaced: state.replaced,
    hazardFlash: watching.hazardFlash,
  };
}

function carrying(hand: Hand): BenchHand['carrying'] {
  switch (hand.kind) {
    case 'probe':
      return { tool: 'probe', colour: hand.probe };
    case 'discharge-clip':
      return { tool: 'discharge', end: 'clip' };
    case 'discharge-tip':
      return { tool: 'discharge', end: 'tip' };
    case 'battery-clip':
      return { tool: 'battery', end: hand.clip };
    case 'empty':
    case 'lead':
    case 'label':
    case 'pad':
    case 'screwdriver':
      return null;
  }
}
