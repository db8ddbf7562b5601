import type { MeterDefinition, Setting } from '../../../shared/instruments/meter.ts';

export interface MeterKey {
  /** what the key sets */ setting: string;
  /** settings that show this key as the one in use */ holds: readonly string[];
  /** short, on the key */ label: string;
  /** in full, for whoever hears it */ name: string;
}

export interface KeyGroup {
  id: 'ohms' | 'checks' | 'dc' | 'ac';
  /** before the first key; empty: the keys say it themselves */ legend: string;
  name: string;
  keys: readonly MeterKey[];
}

const groupOf = (setting: Setting): KeyGroup['id'] | null => {
  switch (setting.function) {
    case 'off':
      return null;
    case 'ohms':
      return 'ohms';
    case 'beep':
    case 'diode':
    case 'capacitance':
      return 'checks';
    case 'dc-volts':
      return 'dc';
    case 'ac-volts':
      return 'ac';
  }
};

const groups: readonly Pick<KeyGroup, 'id' | 'legend' | 'name'>[] = [
  { id: 'ohms', legend: 'Ω', name: 'Ohms' },
  { id: 'checks', legend: '', name: 'Checks' },
  { id: 'dc', legend: 'V⎓', name: 'DC volts' },
  { id: 'ac', legend: 'V~', name: 'AC volts' },
];

/** The meter's keys, grouped: one for each range, or with an auto-ranging meter one for each function. */
export function keyGroups(meter: MeterDefinition): KeyGroup[] {
  return groups
    .map((group) => {
      const settings = meter.settings.filter((setting) => groupOf(setting) === group.id);
      return { ...group, keys: meter.isAutoRanging ? dials(settings) : settings.map(rangeKey) };
    })
    .filter(({ keys }) => keys.length > 0);
}

const rangeKey = (setting: Setting): MeterKey => ({
  setting: setting.id,
  holds: [setting.id],
  label: rangeLabel(setting),
  name: setting.name,
});

/** `ohms-200k` is `200k` on its key, `capacitance-2u` is `2µF`. */
function rangeLabel({ id, function: of }: Setting): string {
  const range = id.split('-')[1];
  if (range === undefined) return id;
  if (of === 'capacitance') return range.replace('u', 'µF');
  return range === '2000M' ? '2G' : range;
}

const dialLabels: Readonly<Record<string, { label: string; name: string }>> = {
  ohms: { label: 'Ω', name: 'ohms' },
  dc: { label: 'V⎓', name: 'DC volts' },
  ac: { label: 'V~', name: 'AC volts' },
  capacitance: { label: 'µF', name: 'capacitance' },
};

function dials(settings: readonly Setting[]): MeterKey[] {
  const names = [...new Set(settings.map(({ dial }) => dial))];
  return names.map((dial) => {
    const ranges = settings.filter((setting) => setting.dial === dial).map(({ id }) => id);
    return {
      setting: ranges[0] ?? dial,
      holds: ranges,
      label: dialLabels[dial]?.label ?? dial,
      name: dialLabels[dial]?.name ?? dial,
    };
  });
}
