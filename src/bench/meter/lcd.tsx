import type { Annunciators } from './annunciators.ts';

interface Props {
  marks: Annunciators;
  /** `94.8`; empty: dark */ display: string;
  unit: string;
  isWarning?: boolean;
  isSmall?: boolean;
}

/** The display: huge digits, small words around them. */
export const Lcd = ({ marks, display, unit, isWarning = false, isSmall = false }: Props) => (
  <div
    className={`grid min-w-0 grid-rows-[auto_1fr_auto] rounded-[7px] bg-lcd px-3 py-1.5 font-mono text-xs font-semibold text-lcd-ink shadow-[inset_0_2px_6px_#0006] ${isSmall ? 'min-w-[136px]' : ''}`}
  >
    <span className="flex min-h-4 justify-between gap-2">
      <span>{marks.mode}</span>
      <span>{marks.relative}</span>
    </span>
    <span className="flex items-center justify-end gap-2 leading-none">
      <span
        data-testid="digits"
        className={`tracking-[-0.05em] ${isSmall ? 'text-[32px]' : 'text-[46px]'} ${isWarning ? 'opacity-60' : ''}`}
      >
        {display}
      </span>
      <span className={`min-w-[22px] ${isSmall ? 'text-sm' : 'text-lg'}`}>{unit}</span>
    </span>
    <span className="flex min-h-4 justify-between gap-2 whitespace-nowrap">
      <span>{marks.range}</span>
      <span className={marks.status === 'settling' ? 'opacity-70' : ''}>{marks.status}</span>
    </span>
  </div>
);
