import type { Step } from '../../shared/bench/perform.ts';
import {
  cause,
  closeUp,
  discharge,
  handIn,
  inspect,
  lift,
  measure,
  openUp,
  probesOff,
  proveDead,
  refit,
  replace,
  report,
  setting,
  verdict,
  zero,
} from './steps.ts';

/** A trainee of the demo school and what they did on a job; the bench gives the readings. */
export interface DemoAttempt {
  email: string;
  /** file name of the job in `scenarios/jobs` */ job: string;
  seed: number;
  steps: readonly Step[];
}

const carefulDiode: Step[] = [
  ...openUp,
  ...discharge,
  ...proveDead,
  inspect('C1'),
  inspect('D1'),
  ...lift('W27/b', '1'),
  setting('ohms-20M'),
  ...measure('D1.a', 'D1.k', 4),
  ...zero('ohms-200'),
  ...measure('D1.a', 'D1.k', 3),
  ...measure('D1.k', 'D1.a', 3),
  verdict('D1', 'faulty'),
  ...lift('W24/b', '2'),
  ...lift('W25/b', '3'),
  ...measure('V1.1', 'V1.2', 3),
  setting('ohms-20M'),
  ...measure('V1.1', 'V1.body', 5),
  verdict('V1', 'good'),
  ...lift('W23/b', '4'),
  ...measure('C1.1', 'C1.2', 60),
  ...measure('C1.1', 'C1.can', 4),
  ...measure('C1.2', 'C1.can', 4),
  verdict('C1', 'good'),
  cause({ on: 'D1', fault: 'shorted' }),
  ...lift('W28/a', '5'),
  replace('D1'),
  refit('W28/a', 'D1.k'),
  refit('W27/b', 'D1.a'),
  refit('W24/b', 'V1.1'),
  refit('W25/b', 'V1.1'),
  refit('W23/b', 'C1.1'),
  ...probesOff,
  ...closeUp,
  report(
    'High-voltage diode D1 shorted: 0.0 ohm both ways with its lead off. Replaced. Capacitor and magnetron measured good.',
    'The rectifier had failed. It is replaced and the oven heats; leakage survey to follow before it leaves.',
  ),
  handIn,
];

const hurriedBoard: Step[] = [
  ...openUp,
  setting('beep'),
  ...measure('F1.1', 'F1.2', 2),
  verdict('F1', 'good'),
  setting('ohms-2k'),
  ...measure('T2.1', 'T2.2', 2),
  ...lift('W8/b', '1'),
  ...measure('T2.1', 'T2.2', 3),
  setting('ohms-2M'),
  ...measure('T2.1', 'T2.2', 3),
  verdict('T2', 'faulty'),
  cause({ on: 'T2', fault: 'primary-open' }),
  refit('W8/b', 'T2.1'),
  report('Board transformer primary open. New board ordered.', 'A part is on order.'),
  handIn,
];

const shockedHeater: Step[] = [
  ...openUp,
  ...lift('W24/b', 'HV'),
  ...zero('ohms-200'),
  ...measure('V1.1', 'V1.2', 3),
  ...lift('W25/b', 'F'),
  ...measure('V1.1', 'V1.2', 3),
  verdict('V1', 'faulty'),
  cause({ on: 'V1', fault: 'heater-open' }),
  report('Magnetron heater open.', 'The magnetron has to be replaced.'),
  handIn,
];

/** One careful, one hurried, one who forgot the capacitor. */
export const demoAttempts: readonly DemoAttempt[] = [
  { email: 'tom@northgate.example', job: 'loud-hum-no-heat', seed: 417, steps: carefulDiode },
  { email: 'mina@northgate.example', job: 'dead-no-display', seed: 2208, steps: hurriedBoard },
  {
    email: 'jonas@northgate.example',
    job: 'quiet-no-heat-open-bleeder',
    seed: 91,
    steps: shockedHeater,
  },
];
