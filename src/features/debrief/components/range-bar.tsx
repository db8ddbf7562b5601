/** A reading against its limits: the band is what a good part gives, the mark is the reading. */
export const RangeBar = ({ place, isWithin }: { place: number; isWithin: boolean }) => (
  <svg aria-hidden viewBox="0 0 120 16" className="h-4 w-[120px] shrink-0">
    <path d="M2 8H118" strokeWidth="2" className="stroke-edge" />
    <rect x="36" y="3" width="48" height="10" rx="2" className="fill-safe-tint stroke-safe" />
    <path
      d={`M${120 * place} 1V15`}
      strokeWidth="4"
      className={isWithin ? 'stroke-ink' : 'stroke-danger'}
    />
  </svg>
);
