import { memo, useCallback } from 'react';
import { Group } from 'react-konva/lib/ReactKonvaCore.js';
import type { ScenePart } from '../../geometry/bench-scene.ts';
import { glyphs } from '../catalogue.ts';
import { Painted } from '../paint/painted.tsx';
import type { Pen } from '../paint/pen.ts';
import { paintNewSticker } from './paint-new-sticker.ts';

/** One part at its place on the bench, turned about its middle. */
export const PartGlyph = memo(function PartGlyph({ part }: { part: ScenePart }) {
  const paint = useCallback(
    (pen: Pen) => {
      glyphs[part.kind](pen, part);
      if (part.isReplaced) paintNewSticker(pen, part.size);
    },
    [part],
  );
  const [width, height] = part.size;
  return (
    <Group
      x={part.at[0] + width / 2}
      y={part.at[1] + height / 2}
      offsetX={width / 2}
      offsetY={height / 2}
      rotation={part.angle}
      listening={false}
    >
      <Painted paint={paint} />
    </Group>
  );
});
