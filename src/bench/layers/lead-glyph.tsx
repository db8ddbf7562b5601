import type Konva from 'konva/lib/Core.js';
import { memo, useLayoutEffect, useRef } from 'react';
import { Shape } from 'react-konva/lib/ReactKonvaCore.js';
import type { SceneLead } from '../geometry/bench-scene.ts';
import { swingLead } from '../geometry/swing-lead.ts';
import { paintLead } from '../glyphs/lead/paint-lead.ts';
import { useSameValue } from './use-same-value.ts';

/** ms that a lead takes to come to lie after it was lifted or fitted. */
const swingMs = 180;

/** One lead. When an end moves it swings there; the frames are drawn on the node, outside React. */
export const LeadGlyph = memo(function LeadGlyph({
  lead: given,
  reducesMotion,
}: {
  lead: SceneLead;
  reducesMotion: boolean;
}) {
  const lead = useSameValue(given);
  const node = useRef<Konva.Shape>(null);
  const drawn = useRef(lead);
  const shown = useRef(lead);
  useLayoutEffect(() => {
    const from = drawn.current;
    drawn.current = lead;
    const show = (next: SceneLead): void => {
      shown.current = next;
      node.current?.getLayer()?.batchDraw();
    };
    if (from === lead || reducesMotion) return show(lead);
    let began: number | null = null;
    let frame = requestAnimationFrame(function step(now) {
      began ??= now;
      const share = Math.min(1, (now - began) / swingMs);
      show(share === 1 ? lead : swingLead(from, lead, share));
      if (share < 1) frame = requestAnimationFrame(step);
    });
    return () => cancelAnimationFrame(frame);
  }, [lead, reducesMotion]);
  return (
    <Shape
      ref={node}
      listening={false}
      perfectDrawEnabled={false}
      sceneFunc={({ _context: pen }) => paintLead(pen, shown.current)}
    />
  );
});
