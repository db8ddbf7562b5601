import { memo, useCallback } from 'react';
import type { Camera } from '../camera/camera.ts';
import type { BenchScene, SceneLead } from '../geometry/bench-scene.ts';
import { paintCord } from '../glyphs/plug/paint-cord.ts';
import { paintTag } from '../glyphs/lead/paint-tag.ts';
import { Painted } from '../glyphs/paint/painted.tsx';
import type { Pen } from '../glyphs/paint/pen.ts';
import { PartGlyph } from '../glyphs/part/part-glyph.tsx';
import { BenchLayer } from './bench-layer.tsx';
import { LeadGlyph } from './lead-glyph.tsx';
import { useSameValue } from './use-same-value.ts';

/** Leads and their tags; the cord with its plug lies over the three leads inside it. With the cover on only the cord shows. */
export const LeadsLayer = memo(function LeadsLayer({
  scene,
  camera,
  reducesMotion,
}: {
  scene: BenchScene;
  camera: Camera;
  reducesMotion: boolean;
}) {
  const leads = useSameValue(scene.leads);
  const cord = useSameValue(scene.cord);
  const plugs = useSameValue(scene.parts.filter(({ kind }) => kind === 'plug'));
  const paintCordJacket = useCallback((pen: Pen) => paintCord(pen, cord), [cord]);
  const paintTags = useCallback(
    (pen: Pen) => tagsOf(leads).forEach((tag) => paintTag(pen, tag)),
    [leads],
  );
  const shown = scene.isCoverOn ? [] : [...leads].sort(byHeight);
  return (
    <BenchLayer camera={camera}>
      {shown.map((lead) => (
        <LeadGlyph key={lead.ref} lead={lead} reducesMotion={reducesMotion} />
      ))}
      <Painted paint={paintCordJacket} />
      {plugs.map((part) => (
        <PartGlyph key={part.ref} part={part} />
      ))}
      {scene.isCoverOn ? null : <Painted paint={paintTags} />}
    </BenchLayer>
  );
});

/** High-voltage leads run above the loom, lifted ones above all. */
const byHeight = (a: SceneLead, b: SceneLead): number => height(a) - height(b);
const height = ({ isHighVoltage, ends }: SceneLead): number =>
  (isHighVoltage ? 1 : 0) + (ends.some((end) => end.seatedOn === null) ? 2 : 0);

const tagsOf = (leads: readonly SceneLead[]) =>
  leads.flatMap(({ ends }) => ends.flatMap(({ tag }) => (tag === null ? [] : [tag])));
