import type { BenchBox } from './bench-box.ts';
import { benchSize } from './bench-furniture.ts';
import type { BenchPoint } from './bench-point.ts';
import type { SceneLabel, SceneLead } from './bench-scene.ts';
import { placeLabels, type LabelWish } from './place-labels.ts';

/** Longest text a tag shows; the rest is in the list beside the bench. */
const longest = 12;

/** Places the yellow tags of labelled lead ends near their connectors, off every terminal and every other label. By lead end. */
export const placeTags = (
  leads: readonly SceneLead[],
  targets: readonly BenchPoint[],
  labels: readonly BenchBox[],
): ReadonlyMap<string, SceneLabel> => {
  const wishes = leads.flatMap(({ ends }) =>
    ends.flatMap(({ target, at, label }) => (label === null ? [] : [wish(target, at, label)])),
  );
  if (wishes.length === 0) return new Map();
  const placed = placeLabels(wishes, {
    points: targets,
    clearance: 9,
    boxes: labels,
    leads: new Map(),
    within: { at: [2, 2], size: [benchSize[0] - 4, benchSize[1] - 4] },
  });
  return new Map([...placed].map(([id, label]) => [id, { ...label, tone: 'on-light' }]));
};

const wish = (target: string, at: BenchPoint, label: string): LabelWish => {
  const text = label.length > longest ? `${label.slice(0, longest - 1)}…` : label;
  const size: BenchPoint = [text.length * 6.4 + 18, 17];
  const choices = [20, 28, 38, 50, 64, 80].flatMap((away) =>
    Array.from({ length: 16 }, (_, i) => {
      const angle = (i * Math.PI) / 8;
      return {
        text,
        size,
        at: [
          at[0] + Math.cos(angle) * (away + size[0] / 2 - 8),
          at[1] + Math.sin(angle) * away,
        ] as BenchPoint,
        cost: away + Math.abs(Math.sin((angle - Math.PI / 2) / 2)) * 6,
      };
    }),
  );
  return { id: target, choices };
};
