import { useEffect, useRef, useState, type ReactNode } from 'react';
import { Button } from './button.tsx';

interface Props {
  /** "the replay and the timeline" */ what: string;
  /** asked for, wherever it stands */ isWanted?: boolean;
  children: ReactNode;
}

/**
 * Renders what is costly to fetch or draw only once it is wanted or comes near to view. Until then a
 * button stands for it, for people who go through a page by other ways than scrolling.
 */
export const WhenNear = ({ what, isWanted = false, children }: Props) => {
  const [isNear, setIsNear] = useState(isWanted);
  // Once here it stays, whatever is wanted later.
  if (isWanted && !isNear) setIsNear(true);
  const place = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const { current } = place;
    if (isNear || !current) return undefined;
    const watch = new IntersectionObserver(
      (entries) => {
        if (entries.some(({ isIntersecting }) => isIntersecting)) setIsNear(true);
      },
      { rootMargin: '150px 0px' },
    );
    watch.observe(current);
    return () => watch.disconnect();
  }, [isNear]);
  if (isNear) return children;
  return (
    <div ref={place} className="min-h-[70dvh]">
      <Button onClick={() => setIsNear(true)}>Show {what}</Button>
    </div>
  );
};
