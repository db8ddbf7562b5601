import { meterBranch } from '../instruments/meter-branch.ts';
import type { BenchBranch } from '../oven/oven-state.ts';
import type { BenchState } from './bench-state.ts';
import type { Setup } from './setup.ts';
import { fingersBranch, meterOnLeads } from './test-leads.ts';

/** Ohm; ENGINE: the discharge lead. */
export const dischargeResistance = 20_000;
/** Ohm; a crocodile clip on a tab. Common practice, no source. */
const clipContact = 0.01;

/** What the bench's tools put between the oven's terminals right now. */
export function branches(setup: Setup, state: BenchState): BenchBranch[] {
  const { probes, discharge, battery, meter } = state;
  const found: BenchBranch[] = [];
  if (probes.red && probes.black && probes.red !== probes.black && !meter.isDestroyed) {
    const leads = meterOnLeads(setup, state);
    const branch = meterBranch(leads, meter.setting, probes.red, probes.black);
    if (branch) found.push(branch);
  }
  const body = fingersBranch(state);
  if (body) found.push(body);
  if (discharge.clip && discharge.tip && discharge.clip !== discharge.tip) {
    found.push(resistor('discharge', discharge.clip, discharge.tip, dischargeResistance));
  }
  if (battery.neg) found.push(resistor('battery-neg', 'BAT.neg', battery.neg, clipContact));
  if (battery.oneK) found.push(resistor('battery-1k', 'BAT.1k', battery.oneK, clipContact));
  if (state.isCordIn) {
    // Between runs the outlet is, for stored charge, a low resistance across the plug: mains has no mean.
    found.push(
      resistor('supply', 'P1.L', 'P1.N', 0.3),
      resistor('supply-earth', 'P1.N', 'P1.E', 0.3),
    );
  }
  return found;
}

export const resistor = (
  name: string,
  from: string,
  to: string,
  resistance: number,
): BenchBranch => ({ name, from, to, resistance, volts: 0 });
