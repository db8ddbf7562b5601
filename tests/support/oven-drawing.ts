import { readFileSync } from 'node:fs';
import { asFitted } from '../../shared/oven/initial-state.ts';
import { ovenLayout } from '../../shared/oven/layout.ts';
import { ovenDefinition } from '../../shared/oven/oven.ts';
import type { OvenState } from '../../shared/oven/oven-state.ts';
import { emptyHand, type BenchHand } from '../../src/bench/geometry/bench-hand.ts';
import type { BenchScene } from '../../src/bench/geometry/bench-scene.ts';
import { buildScene } from '../../src/bench/geometry/build-scene.ts';
import { drawBench } from '../../src/bench/geometry/draw-bench.ts';

const read = (name: string): unknown => JSON.parse(readFileSync(`scenarios/ovens/${name}`, 'utf8'));

/** One oven of `scenarios/ovens` as it is drawn on the bench. */
export function ovenDrawing(id: string) {
  const definition = ovenDefinition.parse(read(`${id}.json`));
  const layout = ovenLayout.parse(read(`${id}.layout.json`));
  const drawing = drawBench(definition, layout);
  const fitted = asFitted(definition, []);
  /** The oven with some lead ends moved: null lifted, or fitted to a terminal. */
  const withLeads = (moved: Record<string, string | null>): OvenState => ({
    ...fitted,
    leadEnds: { ...fitted.leadEnds, ...moved },
  });
  const sceneOf = (oven: OvenState = fitted, hand: Partial<BenchHand> = {}): BenchScene =>
    buildScene(drawing, oven, { ...emptyHand, ...hand });
  return { definition, layout, drawing, fitted, withLeads, sceneOf };
}
