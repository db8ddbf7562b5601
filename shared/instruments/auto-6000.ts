/**
 * Auto-ranging meter of 6000 counts: ohms to 60 MOhm, true-rms AC, no 2000 MOhm range.
 * Its constant-current ohms source is written as an open voltage V with V / I in series: it gives
 * its current into small resistances and cannot drive above V, and R = V/I stays exact between.
 * Source: 2.5 V open on the lowest range, 0.55 V above: ENGINE section 2; currents and errors:
 * judgement beside the published figures in FACTS section 4.2.
 */
import type { MeterDefinition, Setting } from './meter.ts';
import { capacitance, ohms, scale, spec, volts } from './settings.ts';

const full = 5999;
const low = (sourceOhms: number) => ({ volts: 0.55, ohms: sourceOhms });
const strong = { volts: 2.5, ohms: 2500 };
const lagSeconds = 0.8;

const settings: Setting[] = [
  { id: 'off', dial: 'off', name: 'off', function: 'off' },
  ohms('600', '600 Ω', strong, scale('Ω', 1, 1, full), spec(0.9, 3)),
  ohms('6k', '6 kΩ', low(5.5e3), scale('kΩ', 1e3, 3, full), spec(0.9, 2)),
  ohms('60k', '60 kΩ', low(55e3), scale('kΩ', 1e3, 2, full), spec(0.9, 2)),
  ohms('600k', '600 kΩ', low(550e3), scale('kΩ', 1e3, 1, full), spec(0.9, 2)),
  ohms('6M', '6 MΩ', low(5.5e6), scale('MΩ', 1e6, 3, full), spec(0.9, 2)),
  ohms('60M', '60 MΩ', low(11e6), scale('MΩ', 1e6, 2, full), spec(2, 5), { lagSeconds }),
  {
    id: 'beep',
    dial: 'beep',
    name: 'beep',
    function: 'beep',
    openVolts: strong.volts,
    sourceOhms: strong.ohms,
    beepsBelow: 30,
    scale: scale('Ω', 1, 1, full),
    spec: spec(0.9, 3),
  },
  {
    id: 'diode',
    dial: 'diode',
    name: 'diode',
    function: 'diode',
    openVolts: 2.7,
    sourceOhms: 2700,
    scale: scale('V', 1, 3, 1999),
    spec: spec(1, 2),
  },
  capacitance('6u', '6 µF', scale('µF', 1e-6, 3, full), spec(3, 10)),
  capacitance('60u', '60 µF', scale('µF', 1e-6, 2, full), spec(3, 10)),
  volts('dc', '600m', '600 mV DC', scale('mV', 1e-3, 1, full), spec(0.5, 2)),
  volts('dc', '6', '6 V DC', scale('V', 1, 3, full), spec(0.5, 2)),
  volts('dc', '60', '60 V DC', scale('V', 1, 2, full), spec(0.5, 2)),
  volts('dc', '600', '600 V DC', scale('V', 1, 1, full), spec(0.5, 2)),
  volts('dc', '1000', '1000 V DC', scale('V', 1, 0, 1000), spec(0.5, 2)),
  volts('ac', '6', '6 V AC', scale('V', 1, 3, full), spec(1, 3), 'true-rms'),
  volts('ac', '60', '60 V AC', scale('V', 1, 2, full), spec(1, 3), 'true-rms'),
  volts('ac', '600', '600 V AC', scale('V', 1, 1, full), spec(1, 3), 'true-rms'),
];

export const auto6000: MeterDefinition = {
  id: 'auto-6000',
  name: 'Auto-ranging meter, 6000 counts',
  counts: 6000,
  isAutoRanging: true,
  leadOhms: 0.16,
  limits: { warning: 30, passive: 600, any: 1000 },
  settings,
};
