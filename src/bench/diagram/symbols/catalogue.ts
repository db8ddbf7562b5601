import type { PartKindName } from '../../../../shared/oven/oven.ts';
import { boardTransformer } from './board-transformer.ts';
import { chassis } from './chassis.ts';
import { controlBoard } from './control-board.ts';
import { cutOut } from './cut-out.ts';
import { doorSwitch } from './door-switch.ts';
import { filterBoard } from './filter-board.ts';
import { fuse } from './fuse.ts';
import { hvCapacitor } from './hv-capacitor.ts';
import { hvDiode } from './hv-diode.ts';
import { hvFuse } from './hv-fuse.ts';
import { hvTransformer } from './hv-transformer.ts';
import { lamp } from './lamp.ts';
import { magnetron } from './magnetron.ts';
import { mechanicalTimer } from './mechanical-timer.ts';
import { motor } from './motor.ts';
import { plug } from './plug.ts';
import { relay } from './relay.ts';
import { resistor } from './resistor.ts';
import type { SymbolOf } from './symbol.ts';

/** The symbol of each kind of part. */
export const partSymbols: Readonly<Record<PartKindName, SymbolOf>> = {
  plug,
  chassis,
  fuse,
  'filter-board': filterBoard,
  'cut-out': cutOut,
  'door-switch': doorSwitch,
  relay,
  'board-transformer': boardTransformer,
  'control-board': controlBoard,
  'mechanical-timer': mechanicalTimer,
  resistor,
  lamp,
  motor,
  'hv-transformer': hvTransformer,
  'hv-fuse': hvFuse,
  'hv-capacitor': hvCapacitor,
  'hv-diode': hvDiode,
  magnetron,
};
