import type { MeterDefinition } from './meter.ts';
import { settingOf } from './meters.ts';

/** What the meter connects between its tips: `volts`, positive at `from`, behind `resistance` Ohm. */
export interface MeterBranch {
  name: string;
  from: string;
  to: string;
  resistance: number;
  volts: number;
}

/** The meter with its test leads as one branch from red to black; null: off, nothing is connected inside. */
export function meterBranch(
  meter: MeterDefinition,
  settingId: string,
  red: string,
  black: string,
): MeterBranch | null {
  const setting = settingOf(meter, settingId);
  if (!setting) return null;
  const branch = (ohms: number, volts: number): MeterBranch => ({
    name: 'meter',
    from: red,
    to: black,
    resistance: ohms + meter.leadOhms,
    volts,
  });
  switch (setting.function) {
    case 'off':
      return null;
    case 'ohms':
    case 'beep':
    case 'diode':
      return branch(setting.sourceOhms, setting.openVolts);
    case 'dc-volts':
    case 'ac-volts':
    case 'capacitance':
      return branch(setting.inputOhms, 0);
  }
}
