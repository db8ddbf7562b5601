/** Below this zoom a terminal's name would be smaller than 7 px: it only clutters. */
const leastZoomForNames = 0.64;

export interface LabelDetail {
  isTerminalNamed: boolean;
  /** units; null: parts are named in full at their usual size, else only their reference at this size */
  referenceSize: number | null;
}

/** Which names are worth drawing at a zoom (px per unit). Far out only the references, kept at 10.5 px. */
export const labelDetail = (zoom: number): LabelDetail => ({
  isTerminalNamed: zoom >= leastZoomForNames,
  referenceSize: zoom >= leastZoomForNames ? null : Math.round(105 / zoom) / 10,
});
