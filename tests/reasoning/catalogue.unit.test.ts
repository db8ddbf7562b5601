import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { faultsOf } from '../../shared/oven/check-faults.ts';
import { catalogueOf } from '../../shared/reasoning/catalogue.ts';
import { cellsOf } from '../../shared/reasoning/catalogue-table.ts';
import { singleFaults } from '../../shared/reasoning/single-faults.ts';
import { lc28 } from '../support/bench.ts';

const page = readFileSync('DEVELOPERS.md', 'utf8');
const part = page.slice(
  page.indexOf('### Larkfield LC-28'),
  page.indexOf('<!-- end of the catalogue'),
);
const rows = part.split('\n').filter((line) => line.startsWith('| '));

describe('the catalogue in DEVELOPERS.md', () => {
  it('has a row for every fault of every part and lead', () => {
    for (const { on, fault } of singleFaults(lc28)) {
      const { name } = faultsOf(lc28, on)!.find(({ id }) => id === fault)!;
      const its = rows.filter((row) => row.startsWith(`| ${on} |`));
      const named = its.flatMap((row) => row.split(' | ')[1]!.split('; '));
      expect(named, `${on} ${fault}: run npm run catalogue`).toContain(name);
    }
  });

  it('says what the circuit says, for a sample', () => {
    const catalogue = catalogueOf(lc28);
    const sample = [
      { on: 'F1', fault: 'open' },
      { on: 'D1', fault: 'shorted' },
      { on: 'T2', fault: 'primary-open' },
      { on: 'V1', fault: 'heater-open' },
      { on: 'W11', fault: 'open-inside' },
    ];
    for (const fault of sample) {
      const entry = catalogue.entry(fault);
      const cells = cellsOf(catalogue, entry);
      const row = rows.find(
        (one) => one.startsWith(`| ${fault.on} |`) && one.includes(entry.kind.name),
      );
      expect(row, `${fault.on} ${fault.fault}: run npm run catalogue`).toContain(cells);
    }
  }, 60_000);

  it('reads as a technician expects: a shorted diode hums and blows nothing, a heater open is quiet', () => {
    const row = (on: string, name: string): string =>
      rows.find((one) => one.startsWith(`| ${on} | ${name}`)) ?? '';
    expect(row('D1', 'shorted')).toMatch(/hum loud .* no heat/);
    expect(row('D1', 'shorted')).not.toContain('opens');
    expect(row('C1', 'shorted')).toContain('opens F1');
    expect(row('V1', 'heater open')).toMatch(/hum quiet .* leaves C1 foils at (3|4)\d{3} V/);
    expect(row('S1', 'stuck closed')).toContain('opening the door opens F1');
    expect(row('F1', 'blown')).toContain('| dead |');
  });
});
