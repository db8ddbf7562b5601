import type { OvenDefinition, OvenPart } from '../../../shared/oven/oven.ts';
import { partKinds } from '../../../shared/oven/parts/catalogue.ts';

/** What is printed on a part: its rating, never its drawn value. */
export function stampOf(part: OvenPart, { supply }: OvenDefinition): string[] {
  const rating = (name: string): number =>
    part.values?.[name] ?? partKinds[part.kind].values[name]?.nominal ?? NaN;
  switch (part.kind) {
    case 'hv-capacitor': {
      const farads = rating('capacitance');
      return [`${Number((farads * 1e6).toPrecision(2))} µF 2100 V~`];
    }
    case 'fuse': {
      const amps = rating('rating');
      return [Number.isNaN(amps) ? 'T 20 A' : `T ${amps} A`];
    }
    case 'cut-out': {
      const celsius = rating('opensAt');
      return Number.isNaN(celsius) ? [] : [`${celsius} °C`];
    }
    case 'plug':
      return [`${supply.amps} A ${supply.volts > 150 ? 250 : 125} V~`];
    case 'hv-fuse':
      return [`${rating('rating')} A`, '5 kV'];
    case 'resistor':
      return [`${rating('resistance')} Ω`];
    case 'chassis':
    case 'filter-board':
    case 'door-switch':
    case 'relay':
    case 'board-transformer':
    case 'control-board':
    case 'mechanical-timer':
    case 'lamp':
    case 'motor':
    case 'hv-transformer':
    case 'hv-diode':
    case 'magnetron':
      return [];
  }
}
