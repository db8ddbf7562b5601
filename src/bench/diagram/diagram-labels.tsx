import { memo } from 'react';
import type { PlacedLabel } from '../geometry/place-labels.ts';
import { ink } from './diagram-ink.ts';
import { labelSizes } from './label-diagram.ts';

const halo = { paintOrder: 'stroke', stroke: ink.paper, strokeWidth: 3 } as const;

const Small = ({ label, size }: { label: PlacedLabel; size: number }) => (
  <text
    x={label.at[0]}
    y={label.at[1]}
    fontSize={size}
    textAnchor="middle"
    dominantBaseline="central"
    className="font-mono"
    fill={ink.faint}
    {...halo}
  >
    {label.text}
  </text>
);

const PartName = ({ label: { text, box } }: { label: PlacedLabel }) => {
  const [first = '', ...more] = text.split('\n');
  const [ref, ...name] = first.split(' ');
  const top = box.at[1] + labelSizes.part * 0.78;
  return (
    <text x={box.at[0]} y={top} fontSize={labelSizes.name} fill={ink.line} {...halo}>
      <tspan className="font-mono" fontSize={labelSizes.part} fontWeight={700}>
        {ref}
      </tspan>
      {name.length > 0 ? <tspan dx={5}>{name.join(' ')}</tspan> : null}
      {more.map((line) => (
        <tspan key={line} x={box.at[0]} dy={labelSizes.part}>
          {line}
        </tspan>
      ))}
    </text>
  );
};

/** All names: parts in bold with their words, terminals and leads small. */
export const DiagramLabels = memo(function DiagramLabels({
  labels,
}: {
  labels: ReadonlyMap<string, PlacedLabel>;
}) {
  return (
    <g aria-hidden>
      {[...labels].map(([ref, label]) =>
        ref.includes('.') ? (
          <Small key={ref} label={label} size={labelSizes.terminal} />
        ) : ref.startsWith('W') ? (
          <Small key={ref} label={label} size={labelSizes.lead} />
        ) : (
          <PartName key={ref} label={label} />
        ),
      )}
    </g>
  );
});
