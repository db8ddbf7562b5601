import type { SymbolOf } from './symbol.ts';

const ids = ['1', '2', '3', '4', '5', '6'];
/** opposite the windings of a board transformer, and below them the door line */
const heights = [10, 50, 70, 110, 130, 150];

/** A box: what is inside is no business of a bench without a scope, save for what its inputs feed. */
export const controlBoard: SymbolOf = (variant) => {
  const used = variant === 'door-sensing' ? 6 : 4;
  const height = used === 6 ? 160 : 120;
  return {
    size: [110, height],
    body: { at: [10, 0], size: [100, height] },
    terminals: Object.fromEntries(
      ids.slice(0, used).map((id, i): [string, [number, number]] => [id, [0, heights[i] ?? 0]]),
    ),
    strokes: () => [
      { d: `M12 2h96v${height - 4}h-96z` },
      {
        d: heights
          .slice(0, used)
          .map((y) => `M0 ${y}H12`)
          .join(''),
      },
      { d: 'M12 10H40L60 30L40 50H12M40 10L20 30L40 50', kind: 'fine' },
      { d: 'M34 25l7 5l-7 5zM42 24v12', kind: 'fine' },
      { d: 'M12 70H32V80M32 100V110H12M27 80h10v20h-10z', kind: 'fine' },
      ...(used === 6 ? [{ d: 'M12 130H40V150H12', kind: 'fine' as const }] : []),
    ],
    letters: [
      { text: 'supply', at: [84, 30], size: 9 },
      { text: 'display', at: [70, 90], size: 9 },
      ...(used === 6 ? [{ text: 'door line', at: [74, 140] as const, size: 9 }] : []),
    ],
  };
};
