import type { MeterView } from '../../../shared/bench/reading.ts';
import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { MeterDefinition } from '../../../shared/instruments/meter.ts';
import { settingOf } from '../../../shared/instruments/meters.ts';

export interface Annunciators {
  /** left above the digits */ mode: string;
  /** right above the digits */ relative: string;
  /** left below */ range: string;
  /** middle below: what the reading is doing */ status: string;
}

/** The small words around the digits. */
export function annunciators(
  meter: MeterDefinition,
  { meter: on }: BenchState,
  view: MeterView | null,
  isConnected: boolean,
): Annunciators {
  if (on.isDestroyed) return { mode: '', relative: '', range: '', status: 'destroyed' };
  const setting = settingOf(meter, on.setting);
  if (!setting || setting.function === 'off')
    return { mode: '', relative: '', range: 'off', status: '' };
  return {
    mode: meter.isAutoRanging ? 'auto' : 'manual',
    relative: on.relative === null ? '' : 'REL',
    range: setting.name,
    status: statusOf(view, isConnected),
  };
}

function statusOf(view: MeterView | null, isConnected: boolean): string {
  if (!view || !isConnected) return 'tips open';
  if (view.reading.isWarning) return 'voltage: nonsense';
  if (view.reading.isBeeping) return 'beeps';
  return view.isSettled ? 'settled' : 'settling';
}
