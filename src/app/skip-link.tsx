export const SkipLink = () => (
  <a
    href="#main"
    className="sr-only z-30 rounded-md bg-act px-4 py-2 font-semibold text-on-act focus:not-sr-only focus:absolute focus:top-1.5 focus:left-3"
  >
    Skip to the content
  </a>
);
