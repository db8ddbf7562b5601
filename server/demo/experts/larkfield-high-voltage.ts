import type { Step } from '../../../shared/bench/perform.ts';
import {
  cause,
  clean,
  closeUp,
  discharge,
  finalChecks,
  handIn,
  inspect,
  lift,
  measure,
  openUp,
  probesOff,
  proveDead,
  pullCord,
  refit,
  removeCover,
  replace,
  report,
  runMinute,
  setting,
  verdict,
  zero,
} from '../steps.ts';
import type { Expert } from './expert.ts';

// Jobs on the Larkfield LC-28 whose cause is on the high-voltage side.

const makeSafe: Step[] = [...discharge, ...proveDead];

/** The magnetron's leads off, but its second heater lead: enough to measure it alone. */
const magnetronOff: Step[] = [...lift('W24/b', 'from C1'), ...lift('W25/b', 'from T1.H1')];
const magnetronOn: Step[] = [refit('W24/b', 'V1.1'), refit('W25/b', 'V1.1')];
/** On the 200 ohm range, test leads zeroed. */
const heater: Step[] = measure('V1.1', 'V1.2', 3);
const goodHeaterOffBody: Step[] = [
  ...heater,
  setting('ohms-20M'),
  ...measure('V1.1', 'V1.body', 5),
  verdict('V1', 'good'),
];
const goodMagnetron: Step[] = [...magnetronOff, ...zero('ohms-200'), ...goodHeaterOffBody];

/** With its lead W27 off: both ways on 2000 Mohm. */
const bothWays: Step[] = [
  setting('ohms-2000M'),
  ...measure('D1.a', 'D1.k', 8),
  ...measure('D1.k', 'D1.a', 8),
];
const goodDiode: Step[] = [...lift('W27/b', 'D1.a'), ...bothWays, verdict('D1', 'good')];
const shortedDiode: Step[] = [
  ...lift('W27/b', 'D1.a'),
  ...zero('ohms-200'),
  ...measure('D1.a', 'D1.k', 3),
  ...measure('D1.k', 'D1.a', 3),
  verdict('D1', 'faulty'),
];
const newDiode: Step[] = [
  ...lift('W28/a', 'D1.k'),
  replace('D1'),
  refit('W28/a', 'D1.k'),
  refit('W27/b', 'D1.a'),
];

const microfarads: Step[] = [setting('capacitance-2u'), ...measure('C1.1', 'C1.2', 4)];
const toCan: Step[] = [
  setting('ohms-20M'),
  ...measure('C1.1', 'C1.can', 4),
  ...measure('C1.2', 'C1.can', 4),
];
const goodCapacitor: Step[] = [
  ...lift('W23/b', 'C1.1'),
  ...microfarads,
  ...toCan,
  verdict('C1', 'good'),
];

/** Every lead of the capacitor but the one that was lifted to measure it. */
const newCapacitor: Step[] = [
  ...lift('W24/a', 'C1.2'),
  ...lift('W27/a', 'C1.2'),
  replace('C1'),
  refit('W23/b', 'C1.1'),
  refit('W24/a', 'C1.2'),
  refit('W27/a', 'C1.2'),
];

const loudHum: Step[] = [
  ...openUp,
  ...makeSafe,
  inspect('D1'),
  ...shortedDiode,
  ...magnetronOff,
  ...goodHeaterOffBody,
  ...goodCapacitor,
  cause({ on: 'D1', fault: 'shorted' }),
  ...probesOff,
  ...newDiode,
  refit('W23/b', 'C1.1'),
  ...magnetronOn,
  ...closeUp,
  ...finalChecks,
  report(
    'High-voltage diode D1 shorted, zero ohm both ways with its lead off. Magnetron and capacitor measured good, so nothing drove it. Diode replaced, water test and checks in order.',
    'The rectifier of the high voltage had failed and is new. Nothing else was found; the hum is the usual one again.',
  ),
  handIn,
];

const openBleeder: Step[] = [
  ...openUp,
  ...makeSafe,
  ...magnetronOff,
  setting('ohms-20M'),
  ...measure('V1.1', 'V1.2', 4),
  ...measure('V1.1', 'V1.body', 5),
  verdict('V1', 'faulty'),
  ...lift('W23/b', 'C1.1'),
  ...lift('W24/a', 'C1.2'),
  ...lift('W27/a', 'C1.2'),
  ...measure('C1.1', 'C1.2', 240),
  ...measure('C1.1', 'C1.can', 4),
  ...measure('C1.2', 'C1.can', 4),
  verdict('C1', 'faulty'),
  cause({ on: 'V1', fault: 'heater-open' }, { on: 'C1', fault: 'bleeder-open' }),
  ...probesOff,
  ...discharge,
  replace('C1'),
  refit('W23/b', 'C1.1'),
  refit('W24/a', 'C1.2'),
  refit('W27/a', 'C1.2'),
  ...lift('W26/b', 'from T1.H2'),
  replace('V1'),
  ...magnetronOn,
  refit('W26/b', 'V1.2'),
  ...closeUp,
  ...finalChecks,
  report(
    'Magnetron heater open. Besides, the bleeder of the capacitor is open: over range after four minutes where ten megohm belong, so that the charge would have stayed for hours. Magnetron and capacitor replaced.',
    'The magnetron was at its end and is new. The capacitor from last year had a fault of its own that would have endangered whoever opened the oven; it is new as well.',
  ),
  handIn,
];

const twoFuses: Step[] = [
  pullCord,
  removeCover,
  ...makeSafe,
  inspect('C1'),
  setting('beep'),
  ...measure('F1.1', 'F1.2'),
  ...lift('W23/b', 'C1.1'),
  ...zero('ohms-200'),
  ...measure('C1.1', 'C1.2', 3),
  verdict('C1', 'faulty'),
  ...goodDiode,
  ...goodMagnetron,
  ...lift('W14/b', 'S3.COM'),
  ...measure('S3.COM', 'S3.NC', 4),
  verdict('S3', 'good'),
  ...zero('ohms-200'),
  ...lift('W23/a', 'T1.HV'),
  clean('T1.core'),
  ...measure('T1.HV', 'T1.core', 4),
  verdict('T1', 'good'),
  cause({ on: 'C1', fault: 'shorted' }),
  ...probesOff,
  refit('W23/a', 'T1.HV'),
  ...newCapacitor,
  refit('W27/b', 'D1.a'),
  refit('W14/b', 'S3.COM'),
  ...magnetronOn,
  ...closeUp,
  ...finalChecks,
  report(
    'Capacitor C1 shorted, its can swollen: zero ohm with its lead off. Diode, magnetron, high-voltage winding and monitor switch good. Capacitor replaced, same value; the fuse of the right rating holds.',
    'The capacitor had burst inside, and each new fuse went for that reason. It is new. Please let nobody open the oven: what blew there is what can kill.',
  ),
  handIn,
];

const twiceTheMinutes: Step[] = [
  runMinute,
  pullCord,
  removeCover,
  ...makeSafe,
  inspect('V1'),
  inspect('C1'),
  ...goodMagnetron,
  ...goodDiode,
  ...lift('W23/b', 'C1.1'),
  ...microfarads,
  setting('ohms-20M'),
  ...measure('C1.1', 'C1.2', 60),
  verdict('C1', 'faulty'),
  ...zero('ohms-200'),
  ...lift('W11/b', 'T1.1'),
  ...measure('T1.1', 'T1.2', 3),
  verdict('T1', 'good'),
  cause({ on: 'C1', fault: 'drifted' }),
  ...probesOff,
  ...newCapacitor,
  refit('W27/b', 'D1.a'),
  refit('W11/b', 'T1.1'),
  ...magnetronOn,
  ...closeUp,
  ...finalChecks,
  report(
    'Capacitor C1 has lost nearly half of its capacitance; its ohms are good. Half the capacitance, half the heat. Magnetron heater and insulation, diode and primary good. Capacitor replaced; one litre rises by ten kelvin in a minute.',
    'The capacitor had grown weak, not the magnetron. It is new and the oven has its full strength.',
  ),
  handIn,
];

const newMagnetron: Step[] = [
  ...openUp,
  ...makeSafe,
  inspect('V1'),
  inspect('C1'),
  ...lift('W25/b', 'from T1.H1'),
  ...zero('ohms-200'),
  ...goodHeaterOffBody,
  ...goodDiode,
  ...goodCapacitor,
  cause({ on: 'W24', fault: 'off-b' }),
  ...probesOff,
  refit('W24/b', 'V1.1'),
  refit('W25/b', 'V1.1'),
  refit('W27/b', 'D1.a'),
  refit('W23/b', 'C1.1'),
  ...closeUp,
  ...finalChecks,
  report(
    'Lead W24 from the capacitor had been left off the magnetron: its end hung loose with the whole charge of the capacitor on it. Refitted to V1.1. New magnetron, diode and capacitor measured good.',
    'A wire had been left off when the magnetron was fitted. That was our mistake; there is no charge.',
  ),
  handIn,
];

const growl: Step[] = [
  ...openUp,
  ...makeSafe,
  inspect('T1'),
  setting('ohms-20M'),
  ...measure('F1.1', 'F1.2', 3),
  ...goodDiode,
  ...goodMagnetron,
  ...goodCapacitor,
  ...lift('W23/a', 'T1.HV'),
  clean('T1.core'),
  ...zero('ohms-200'),
  ...measure('T1.HV', 'T1.core', 8),
  ...lift('W11/b', 'T1.1'),
  ...measure('T1.1', 'T1.2', 3),
  verdict('T1', 'faulty'),
  cause({ on: 'T1', fault: 'hv-shorted-to-core' }),
  ...probesOff,
  ...lift('W12/a', 'T1.2'),
  ...lift('W25/a', 'T1.H1'),
  ...lift('W26/a', 'T1.H2'),
  replace('T1'),
  replace('F1'),
  refit('W11/b', 'T1.1'),
  refit('W12/a', 'T1.2'),
  refit('W25/a', 'T1.H1'),
  refit('W26/a', 'T1.H2'),
  refit('W23/a', 'T1.HV'),
  refit('W23/b', 'C1.1'),
  refit('W27/b', 'D1.a'),
  ...magnetronOn,
  ...closeUp,
  ...finalChecks,
  report(
    'High-voltage winding of T1 burnt through to the core: some 50 ohm where 80 to 120 belong, paper charred. Primary, diode, magnetron and capacitor good. Transformer and fuse replaced.',
    'The big transformer had burnt through inside and is new. Keep the air openings free and the filter mat clean; it had run too hot.',
  ),
  handIn,
];

const thirdDiode: Step[] = [
  ...openUp,
  ...makeSafe,
  inspect('D1'),
  inspect('V1'),
  ...shortedDiode,
  // A diode does not short twice in two months by itself.
  ...magnetronOff,
  ...heater,
  ...measure('V1.1', 'V1.body', 3),
  verdict('V1', 'faulty'),
  ...goodCapacitor,
  ...lift('W23/a', 'T1.HV'),
  clean('T1.core'),
  ...zero('ohms-200'),
  ...measure('T1.HV', 'T1.core', 6),
  verdict('T1', 'good'),
  cause({ on: 'D1', fault: 'shorted' }, { on: 'V1', fault: 'heater-shorted-to-body' }),
  ...probesOff,
  ...newDiode,
  ...lift('W26/b', 'from T1.H2'),
  replace('V1'),
  ...magnetronOn,
  refit('W26/b', 'V1.2'),
  refit('W23/a', 'T1.HV'),
  refit('W23/b', 'C1.1'),
  ...closeUp,
  ...finalChecks,
  report(
    'Diode D1 shorted again, and the reason: magnetron V1, heater to body two ohm with its leads off. A new diode alone would hum as loud. Both replaced; capacitor and high-voltage winding good.',
    'The magnetron had been shorting inside and took one rectifier after the other with it. Both are new; we ought to have measured it in March.',
  ),
  handIn,
];

export const larkfieldHighVoltage: readonly Expert[] = [
  { job: 'loud-hum-no-heat', seed: 21, steps: loudHum },
  { job: 'quiet-no-heat-open-bleeder', seed: 22, steps: openBleeder },
  { job: 'two-fuses-one-evening', seed: 23, steps: twoFuses },
  { job: 'twice-the-minutes', seed: 24, steps: twiceTheMinutes },
  { job: 'cold-since-the-new-magnetron', seed: 25, steps: newMagnetron },
  { job: 'growl-then-nothing', seed: 26, steps: growl },
  { job: 'third-diode-this-year', seed: 27, steps: thirdDiode },
];
