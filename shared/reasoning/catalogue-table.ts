import type { RunOutcome } from '../bench/record.ts';
import type { OvenDefinition } from '../oven/oven.ts';
import type { Catalogue, CatalogueEntry } from './catalogue.ts';
import { catalogueOf } from './catalogue.ts';
import { singleFaults } from './single-faults.ts';

/** V on a capacitor that a run without heat leaves; below is nobody's concern. */
const CHARGE = 60;

interface Row {
  readonly on: string;
  readonly names: string[];
  readonly look: string;
  readonly cells: string;
}

/** The catalogue of one oven as tables in Markdown; neighbouring faults that show alike share a row. */
export function catalogueTable(definition: OvenDefinition): string {
  const catalogue = catalogueOf(definition);
  const rows: Row[] = [];
  for (const fault of singleFaults(definition)) {
    const entry = catalogue.entry(fault);
    const isLead = definition.leads.some(({ ref }) => ref === fault.on);
    const look = isLead ? '' : (entry.kind.look ?? '–');
    const cells = cellsOf(catalogue, entry);
    const last = rows.at(-1);
    if (last?.on === fault.on && last.cells === cells && last.look === look)
      last.names.push(entry.kind.name);
    else rows.push({ on: fault.on, names: [entry.kind.name], look, cells });
  }
  const ofParts = rows.filter(({ look }) => look !== '');
  const ofLeads = rows.filter(({ look }) => look === '');
  return [
    `### ${definition.maker} ${definition.model}`,
    '',
    goodRun(catalogue.healthy),
    '',
    '| on | fault | seen from close | cold: good → faulty | 60 s run |',
    '| --- | --- | --- | --- | --- |',
    ...ofParts.map(
      ({ on, names, look, cells }) => `| ${on} | ${names.join('; ')} | ${look} | ${cells} |`,
    ),
    '',
    '| lead | fault | cold: good → faulty | 60 s run |',
    '| --- | --- | --- | --- |',
    ...ofLeads.map(({ on, names, cells }) => `| ${on} | ${names.join('; ')} | ${cells} |`),
    '',
  ].join('\n');
}

/** The last two cells of a fault's row. */
export const cellsOf = (catalogue: Catalogue, entry: CatalogueEntry): string =>
  `${readingsCell(entry)} | ${runCell(catalogue, entry)}`;

/** `hv-winding 95.3 Ω → OL`, one after another. */
const readingsCell = ({ readings }: CatalogueEntry): string =>
  readings.map(({ line, good, faulty }) => `${line.id} ${good} → ${faulty}`).join('; ') || 'none';

/** How a run differs from a good oven's; `as good` where it does not. */
function runCell({ healthy }: Catalogue, entry: CatalogueEntry): string {
  const { run, runsByItself, opensWithDoor } = entry;
  const found = [
    ...(runsByItself ? ['runs by itself'] : []),
    ...(isDead(run)
      ? ['dead']
      : [...seen(healthy, run), ...sound(healthy, run), ...heat(healthy, run)]),
    ...(run.opened.length > 0 ? [`opens ${run.opened.join(' ')}`] : []),
    ...charge(healthy, run),
    ...(opensWithDoor.length > 0 ? [`opening the door opens ${opensWithDoor.join(' ')}`] : []),
  ];
  return found.join(', ') || 'as good';
}

/** Nothing to be seen or heard from the start. */
const isDead = (run: RunOutcome): boolean =>
  run.isDisplayLit !== true &&
  run.isTimerRunning !== true &&
  !run.isLampLit &&
  !run.isFanTurning &&
  !run.isTurntableTurning &&
  run.hum === 'none' &&
  run.atFirst === undefined;

function seen(healthy: RunOutcome, run: RunOutcome): string[] {
  const told = <T>(was: T, is: T, word: string): string[] => (was === is ? [] : [word]);
  return [
    ...told(healthy.isDisplayLit, run.isDisplayLit, 'display dark'),
    ...told(healthy.isTimerRunning, run.isTimerRunning, 'timer still'),
    ...told(healthy.isLampLit, run.isLampLit, 'lamp dark'),
    ...told(healthy.isFanTurning, run.isFanTurning, 'fan still'),
    ...told(healthy.isTurntableTurning, run.isTurntableTurning, 'turntable still'),
    ...told(healthy.hood?.isLampLit, run.hood?.isLampLit, 'cooktop lamp dark'),
    ...told(healthy.hood?.isVentTurningLow, run.hood?.isVentTurningLow, 'vent still on low'),
    ...told(healthy.hood?.isVentTurningHigh, run.hood?.isVentTurningHigh, 'vent still on high'),
  ];
}

function sound(healthy: RunOutcome, run: RunOutcome): string[] {
  const { atFirst } = run;
  if (atFirst) return [`hum ${atFirst.hum} for ${atFirst.seconds.toFixed(1)} s, then ${run.hum}`];
  const isOther = run.hum !== healthy.hum;
  const amps = Math.abs(run.current - healthy.current) > 0.3 ? ` ${run.current.toFixed(1)} A` : '';
  return isOther ? [`hum ${run.hum}${amps}`] : amps ? [`draws${amps}`] : [];
}

function heat(healthy: RunOutcome, run: RunOutcome): string[] {
  const share = run.waterRise / healthy.waterRise;
  if (share < 0.02) return ['no heat'];
  return Math.abs(share - 1) < 0.03 ? [] : [`heat ${Math.round(100 * share)} %`];
}

/** While the magnetron takes it, what is left depends on the instant of switching off and tells nothing. */
function charge(healthy: RunOutcome, run: RunOutcome): string[] {
  if (run.waterRise > 0.02 * healthy.waterRise) return [];
  return Object.entries(run.charge)
    .filter(([, volts]) => Math.abs(volts) > CHARGE)
    .map(([name, volts]) => `leaves ${name.replace(':', ' ')} at ${Math.round(volts)} V`);
}

function goodRun(run: RunOutcome): string {
  const amps = run.current.toFixed(1);
  const rise = run.waterRise.toFixed(1);
  return `A good one draws ${amps} A and warms 1 kg of water by ${rise} K in 60 s.`;
}
