import { describe } from 'vitest';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { holdsItsServiceData } from './holds-its-service-data.ts';
import { loadOven, onBench } from './oven-on-bench.ts';

const bench = onBench(loadOven('larkfield-lc-28'));

describe('service data of the LC-28', () => {
  const bad: [string, AppliedFault][] = [
    ['fuse', { on: 'F1', fault: 'open' }],
    ['magnetron-cut-out', { on: 'F2', fault: 'open' }],
    ['cavity-cut-out', { on: 'F3', fault: 'open' }],
    ['earth', { on: 'W3', fault: 'open-inside' }],
    ['earth', { on: 'W3', fault: 'burnt-connector-b' }],
    ['filter-bleeder', { on: 'Z1', fault: 'bleeder-open' }],
    ['primary-switch-pressed', { on: 'S1', fault: 'contact-open' }],
    ['primary-switch-released', { on: 'S1', fault: 'welded' }],
    ['secondary-switch-pressed', { on: 'S2', fault: 'contact-open' }],
    ['secondary-switch-released', { on: 'S2', fault: 'leaky' }],
    ['monitor-switch-released', { on: 'S3', fault: 'contact-open' }],
    ['monitor-switch-pressed', { on: 'S3', fault: 'welded' }],
    ['hv-relay-contact', { on: 'K1', fault: 'contact-welded' }],
    ['lamp-relay-contact', { on: 'K2', fault: 'contact-welded' }],
    ['hv-relay-coil', { on: 'K1', fault: 'coil-open' }],
    ['lamp', { on: 'E1', fault: 'open' }],
    ['fan', { on: 'M1', fault: 'open' }],
    ['fan', { on: 'M1', fault: 'shorted-turns' }],
    ['turntable', { on: 'M2', fault: 'open' }],
    ['board-primary', { on: 'T2', fault: 'primary-open' }],
    ['board-primary', { on: 'T2', fault: 'shorted-turns' }],
    ['board-eleven-volt', { on: 'T2', fault: 'eleven-volt-open' }],
    ['board-five-volt', { on: 'T2', fault: 'five-volt-open' }],
    ['board-primary-core', { on: 'T2', fault: 'primary-leaky-to-core' }],
    ['display-filament', { on: 'A1', fault: 'display-filament-open' }],
    ['hv-primary', { on: 'T1', fault: 'primary-open' }],
    ['hv-primary-core', { on: 'T1', fault: 'primary-leaky-to-core' }],
    ['heater-winding', { on: 'T1', fault: 'heater-winding-open' }],
    ['heater-winding-core', { on: 'T1', fault: 'heater-winding-shorted-to-core' }],
    ['hv-winding', { on: 'T1', fault: 'hv-open' }],
    ['hv-winding', { on: 'T1', fault: 'hv-shorted-to-core' }],
    ['capacitor-terminals', { on: 'C1', fault: 'shorted' }],
    ['capacitor-bleeder', { on: 'C1', fault: 'bleeder-open' }],
    ['capacitor-bleeder', { on: 'C1', fault: 'leaky' }],
    ['capacitor-can-1', { on: 'C1', fault: 'leaky-to-can' }],
    ['capacitor-can-2', { on: 'C1', fault: 'shorted-to-can' }],
    ['diode-forward', { on: 'D1', fault: 'open' }],
    ['diode-reverse', { on: 'D1', fault: 'leaky' }],
    ['diode-reverse', { on: 'D1', fault: 'reversed' }],
    ['magnetron-heater', { on: 'V1', fault: 'heater-open' }],
    ['magnetron-heater', { on: 'V1', fault: 'heater-loose' }],
    ['magnetron-body-1', { on: 'V1', fault: 'leaky' }],
    ['magnetron-body-2', { on: 'V1', fault: 'heater-shorted-to-body' }],
  ];
  // FACTS 6.3: cold ohms stay normal with shorted turns; the fault must be found by a run.
  const unseen: AppliedFault[] = [
    { on: 'T1', fault: 'shorted-turns' },
    { on: 'T1', fault: 'breaks-down' },
    { on: 'C1', fault: 'breaks-down' },
    { on: 'C1', fault: 'drifted' },
    { on: 'C1', fault: 'open' },
    { on: 'D1', fault: 'breaks-down' },
    { on: 'V1', fault: 'weak' },
    { on: 'V1', fault: 'cracked-magnet' },
    { on: 'F2', fault: 'welded' },
    { on: 'F2', fault: 'weak' },
    { on: 'M1', fault: 'seized' },
    { on: 'A1', fault: 'dead' },
  ];
  holdsItsServiceData(bench, { seeds: 10, bad, unseen });
});
