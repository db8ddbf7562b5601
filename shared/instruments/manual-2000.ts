/**
 * Manual-ranging meter of 2000 counts: the table of ENGINE section 2.
 * Ohms are ratiometric: reading = 1000 R / Rstandard, so a range of 200 Ohm over-ranges at 2 x 100 Ohm.
 * Source: converter facts and published meter figures in FACTS sections 4.1 and 4.2.
 */
import type { MeterDefinition, Setting } from './meter.ts';
import { capacitance, ohms, scale, spec, volts } from './settings.ts';

const full = 1999;
const low = (sourceOhms: number) => ({ volts: 0.65, ohms: sourceOhms });
const strong = { volts: 3, ohms: 2900 };
/** s, 20 MOhm and up */
const lagSeconds = 0.8;

const settings: Setting[] = [
  { id: 'off', dial: 'off', name: 'off', function: 'off' },
  ohms('200', '200 Ω', strong, scale('Ω', 1, 1, full), spec(0.8, 2)),
  ohms('2k', '2 kΩ', low(1900), scale('kΩ', 1e3, 3, full), spec(0.8, 2)),
  ohms('20k', '20 kΩ', low(11e3), scale('kΩ', 1e3, 2, full), spec(0.8, 2)),
  ohms('200k', '200 kΩ', low(105e3), scale('kΩ', 1e3, 1, full), spec(0.8, 2)),
  ohms('2M', '2 MΩ', low(1.05e6), scale('MΩ', 1e6, 3, full), spec(1, 2)),
  ohms('20M', '20 MΩ', low(10e6), scale('MΩ', 1e6, 2, full), spec(2, 5), { lagSeconds }),
  ohms('2000M', '2000 MΩ', { volts: 3, ohms: 10e6 }, scale('MΩ', 1e6, 0, full), spec(5, 10), {
    lagSeconds,
    showsSourceOhms: true,
  }),
  {
    id: 'beep',
    dial: 'beep',
    name: 'beep',
    function: 'beep',
    openVolts: strong.volts,
    sourceOhms: strong.ohms,
    beepsBelow: 50,
    scale: scale('Ω', 1, 1, full),
    spec: spec(0.8, 2),
  },
  {
    id: 'diode',
    dial: 'diode',
    name: 'diode',
    function: 'diode',
    openVolts: 3,
    sourceOhms: 3000,
    scale: scale('V', 1, 3, full),
    spec: spec(1, 2),
  },
  capacitance('2u', '2 µF', scale('µF', 1e-6, 3, full), spec(3, 10)),
  capacitance('20u', '20 µF', scale('µF', 1e-6, 2, full), spec(3, 10)),
  volts('dc', '200m', '200 mV DC', scale('mV', 1e-3, 1, full), spec(0.5, 1)),
  volts('dc', '2', '2 V DC', scale('V', 1, 3, full), spec(0.5, 1)),
  volts('dc', '20', '20 V DC', scale('V', 1, 2, full), spec(0.5, 1)),
  volts('dc', '200', '200 V DC', scale('V', 1, 1, full), spec(0.5, 1)),
  volts('dc', '1000', '1000 V DC', scale('V', 1, 0, 1000), spec(0.5, 1)),
  volts('ac', '200', '200 V AC', scale('V', 1, 1, full), spec(1.2, 10), 'average'),
  volts('ac', '600', '600 V AC', scale('V', 1, 0, 600), spec(1.2, 10), 'average'),
];

export const manual2000: MeterDefinition = {
  id: 'manual-2000',
  name: 'Manual meter, 2000 counts',
  counts: 2000,
  isAutoRanging: false,
  leadOhms: 0.16,
  limits: { warning: 30, passive: 600, any: 1000 },
  settings,
};
