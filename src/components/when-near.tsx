import { useEffect, useRef, useState, type ReactNode } from 'react';

interface Props {
  /** what stands in its place until then, about as high */ meanwhile: ReactNode;
  children: ReactNode;
}

/** Renders what is costly to fetch or draw only once it comes within a screen's half of view. */
export const WhenNear = ({ meanwhile, children }: Props) => {
  const [isNear, setIsNear] = useState(false);
  const place = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const { current } = place;
    if (isNear || !current) return undefined;
    const watch = new IntersectionObserver(
      (entries) => {
        if (entries.some(({ isIntersecting }) => isIntersecting)) setIsNear(true);
      },
      { rootMargin: '50% 0px' },
    );
    watch.observe(current);
    return () => watch.disconnect();
  }, [isNear]);
  return isNear ? children : <div ref={place}>{meanwhile}</div>;
};
