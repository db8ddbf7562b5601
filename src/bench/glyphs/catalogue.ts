import type { PartKindName } from '../../../shared/oven/oven.ts';
import { boardTransformerGlyph } from './board-transformer/board-transformer-glyph.ts';
import { chassisGlyph } from './chassis/chassis-glyph.ts';
import { controlBoardGlyph } from './control-board/control-board-glyph.ts';
import { cutOutGlyph } from './cut-out/cut-out-glyph.ts';
import { doorSwitchGlyph } from './door-switch/door-switch-glyph.ts';
import { filterBoardGlyph } from './filter-board/filter-board-glyph.ts';
import { fuseGlyph } from './fuse/fuse-glyph.ts';
import type { Glyph } from './glyph.ts';
import { hvCapacitorGlyph } from './hv-capacitor/hv-capacitor-glyph.ts';
import { hvDiodeGlyph } from './hv-diode/hv-diode-glyph.ts';
import { hvFuseGlyph } from './hv-fuse/hv-fuse-glyph.ts';
import { hvTransformerGlyph } from './hv-transformer/hv-transformer-glyph.ts';
import { lampGlyph } from './lamp/lamp-glyph.ts';
import { magnetronGlyph } from './magnetron/magnetron-glyph.ts';
import { mechanicalTimerGlyph } from './mechanical-timer/mechanical-timer-glyph.ts';
import { motorGlyph } from './motor/motor-glyph.ts';
import { plugGlyph } from './plug/plug-glyph.ts';
import { relayGlyph } from './relay/relay-glyph.ts';
import { resistorGlyph } from './resistor/resistor-glyph.ts';

/** The drawing of every kind of part: a new kind is one folder and one line here. */
export const glyphs: Readonly<Record<PartKindName, Glyph>> = {
  plug: plugGlyph,
  chassis: chassisGlyph,
  fuse: fuseGlyph,
  'filter-board': filterBoardGlyph,
  'cut-out': cutOutGlyph,
  'door-switch': doorSwitchGlyph,
  relay: relayGlyph,
  'board-transformer': boardTransformerGlyph,
  'control-board': controlBoardGlyph,
  'mechanical-timer': mechanicalTimerGlyph,
  resistor: resistorGlyph,
  lamp: lampGlyph,
  motor: motorGlyph,
  'hv-transformer': hvTransformerGlyph,
  'hv-fuse': hvFuseGlyph,
  'hv-capacitor': hvCapacitorGlyph,
  'hv-diode': hvDiodeGlyph,
  magnetron: magnetronGlyph,
};
