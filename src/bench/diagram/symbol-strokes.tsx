import { memo } from 'react';
import { ink } from './diagram-ink.ts';
import type { PlacedSymbol } from './place-symbol.ts';
import type { Contacts, Stroke } from './symbols/symbol.ts';

const widths = { fine: 1.1, heavy: 2.6, dashed: 1, filled: 0.5, plain: 1.6 } as const;

const Line = ({ d, kind }: Stroke) => (
  <path
    d={d}
    fill={kind === 'filled' ? ink.line : 'none'}
    stroke={kind === 'dashed' ? ink.faint : ink.line}
    strokeWidth={widths[kind ?? 'plain']}
    strokeDasharray={kind === 'dashed' ? '4 3' : undefined}
    strokeLinecap="round"
    strokeLinejoin="round"
  />
);

/** One part's symbol as its contacts stand; `stands` spells them, so that it is drawn anew only when they move. */
export const SymbolStrokes = memo(function SymbolStrokes({
  placed,
  stands,
}: {
  placed: PlacedSymbol;
  stands: string;
}) {
  const contacts = JSON.parse(stands) as Contacts;
  return (
    <>
      <g transform={placed.transform} data-symbol={placed.part.ref}>
        {placed.symbol.strokes(contacts).map((stroke, i) => (
          <Line key={i} {...stroke} />
        ))}
      </g>
      {placed.letters.map(({ text, at, size }) => (
        <text
          key={text}
          x={at[0]}
          y={at[1]}
          fontSize={size}
          textAnchor="middle"
          dominantBaseline="central"
          className="font-mono"
          fill={ink.line}
        >
          {text}
        </text>
      ))}
    </>
  );
});
