import type { SceneTerminal } from '../../geometry/bench-scene.ts';
import { material, palette, shade } from '../../../styles/tokens.ts';
import { grain } from '../paint/grain.ts';
import { circle, disc, fill, rule, stroke } from '../paint/outline.ts';
import { radial, type Pen } from '../paint/pen.ts';

/** Radius of a terminal's face, units. */
export const faceRadius = 5;

/** A terminal as it lies there: bare metal, under varnish, cleaned, or the mouth of a lifted connector. */
export const paintTerminal = (
  pen: Pen,
  terminal: Pick<SceneTerminal, 'at' | 'state' | 'probes'>,
): void => {
  const [x, y] = terminal.at;
  if (terminal.state === 'varnished') paintVarnish(pen, x, y);
  if (terminal.state === 'cleaned') paintCleanSpot(pen, x, y);
  disc(pen, [x, y, faceRadius + 3], shade.soft);
  const face = {
    bare: material.nylon[0],
    varnished: material.varnish[0],
    cleaned: material.tin[0],
    'loose-end': material.brass[0],
  }[terminal.state];
  disc(pen, [x, y, faceRadius], face, palette.ink, 1.7);
  if (terminal.state === 'varnished') disc(pen, [x, y, 1.6], material.varnish[3]);
  if (terminal.probes.length > 0) paintTouched(pen, x, y, terminal.probes);
};

const paintVarnish = (pen: Pen, x: number, y: number): void => {
  pen.beginPath();
  pen.ellipse(x, y, 13, 10.5, 0.3, 0, Math.PI * 2);
  fill(pen, radial(pen, [x, y, 13], material.varnish));
  stroke(pen, material.varnish[3], 0.8);
  pen.beginPath();
  pen.ellipse(x - 4, y - 5, 5, 1.8, -0.4, 0, Math.PI * 2);
  fill(pen, shade.sheen);
};

const paintCleanSpot = (pen: Pen, x: number, y: number): void => {
  pen.beginPath();
  pen.ellipse(x, y, 14, 11.5, 0.3, 0, Math.PI * 2);
  fill(pen, material.varnish[2]);
  pen.beginPath();
  pen.ellipse(x, y, 12, 9.5, 0.3, 0, Math.PI * 2);
  fill(pen, radial(pen, [x, y, 12], material.tin.slice(0, 3)));
  for (let i = 0; i < 9; i++) {
    const dy = -7 + i * 1.8;
    const reach = 8 - Math.abs(dy) * 0.6;
    rule(
      pen,
      [x - reach * grain(i), y + dy + 2, x + reach * grain(i + 20), y + dy - 2],
      i % 2 === 0 ? shade.gleam : shade.soft,
      0.7,
    );
  }
};

const paintTouched = (pen: Pen, x: number, y: number, probes: SceneTerminal['probes']): void => {
  probes.forEach((colour, i) => {
    circle(pen, x, y, faceRadius + 3.2 + i * 2.6);
    stroke(pen, colour === 'red' ? palette['probe-red'] : palette['probe-black'], 2.2);
  });
};

/** The ring around a target under the hand (thin) or with the keyboard's focus (thick, blue on white). */
export const paintRing = (
  pen: Pen,
  [x, y]: readonly [number, number],
  kind: 'hover' | 'focus',
): void => {
  circle(pen, x, y, faceRadius + 5.5);
  stroke(pen, palette.sheet, kind === 'focus' ? 6 : 4);
  circle(pen, x, y, faceRadius + 5.5);
  stroke(pen, palette.act, kind === 'focus' ? 3.2 : 1.8);
};
