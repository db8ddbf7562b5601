import { ovenDrawing } from './oven-drawing.ts';

export const { definition, layout, drawing, fitted, withLeads, sceneOf } =
  ovenDrawing('larkfield-lc-28');
