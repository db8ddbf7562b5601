import { useEffect, useRef } from 'react';
import { useBlocker, useLocation } from 'react-router-dom';

/** Stops leaving a page with unsaved changes: inside the client by a blocker, else by the browser's own question. */
export const useLeaveGuard = (isDirty: boolean) => {
  const mayLeave = useRef(false);
  const { pathname } = useLocation();
  useEffect(() => {
    mayLeave.current = false;
  }, [pathname]);
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) =>
      isDirty && !mayLeave.current && currentLocation.pathname !== nextLocation.pathname,
  );
  useEffect(() => {
    if (!isDirty) return undefined;
    const ask = (event: BeforeUnloadEvent): void => {
      if (!mayLeave.current) event.preventDefault();
    };
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [isDirty]);
  /** the next step is ours, and all is saved: the form's own state says so only after the next render */
  const letLeave = (): void => {
    mayLeave.current = true;
  };
  return { blocker, letLeave };
};
