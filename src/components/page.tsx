import { useEffect, useRef, type ReactNode } from 'react';
import { useLocation } from 'react-router-dom';

interface Props {
  /** the heading, and the window's title */ title: string;
  /** one sentence under the heading */ lead?: ReactNode;
  /** what can be done with the whole page, beside the heading */ actions?: ReactNode;
  /** forms and texts read better narrow; tables need the room */ isNarrow?: boolean;
  children: ReactNode;
}

/** After navigation the heading takes the focus; on the first load the browser's own start is right. */
const useFocusAfterNavigation = () => {
  const heading = useRef<HTMLHeadingElement>(null);
  const { key, pathname } = useLocation();
  // Filters and moments live in the query string and must not move the focus: the path alone counts.
  const seen = useRef(key === 'default' ? pathname : null);
  useEffect(() => {
    if (seen.current !== pathname) heading.current?.focus({ preventScroll: true });
    seen.current = pathname;
  }, [pathname]);
  return heading;
};

export const Page = ({ title, lead, actions, isNarrow = false, children }: Props) => {
  const heading = useFocusAfterNavigation();
  return (
    <div
      className={`mx-auto grid w-full gap-8 px-4 py-6 sm:px-6 sm:py-8 ${isNarrow ? 'max-w-[720px]' : 'max-w-[1200px]'}`}
    >
      <title>{`${title} – Coldbench`}</title>
      <div className="flex flex-wrap items-start justify-between gap-x-6 gap-y-3">
        <div className="grid max-w-[68ch] gap-1">
          <h1 ref={heading} tabIndex={-1} className="text-2xl leading-tight font-bold">
            {title}
          </h1>
          {lead ? <div className="text-lg text-ink-2">{lead}</div> : null}
        </div>
        {actions ? <div className="flex flex-wrap gap-3">{actions}</div> : null}
      </div>
      {children}
    </div>
  );
};
