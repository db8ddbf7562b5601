/** Below this zoom a terminal's name would be smaller than 7 px: it only clutters. */
const leastZoomForTerminals = 0.64;

/** Which names are worth drawing at a zoom (px per unit). */
export const labelDetail = (zoom: number): { isTerminalNamed: boolean } => ({
  isTerminalNamed: zoom >= leastZoomForTerminals,
});
