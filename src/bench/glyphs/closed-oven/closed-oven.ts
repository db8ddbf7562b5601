import type { BenchBox } from '../../geometry/bench-box.ts';
import type { Pen } from '../paint/pen.ts';

/** What of a closed oven can be seen. */
export interface ClosedOven extends BenchBox {
  isDoorOpen: boolean;
  isLampLit: boolean;
  isTurning: boolean;
  isDisplayLit: boolean;
  /** what the display shows; null: its own */ display: string | null;
  /** where the timer's knob stands, minutes; null: the oven has keys and a display */
  atMinute: number | null;
  /** the lamp over the cooktop */ isHoodLit: boolean;
  isVentTurning: boolean;
}

/** Draws one type of oven with its cover on. */
export type PaintClosedOven = (pen: Pen, oven: ClosedOven) => void;
