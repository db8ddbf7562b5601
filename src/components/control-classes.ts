/** Text boxes and lists to choose from. 16 px on a phone, or its browser zooms the page in on focus. */
export const controlClasses =
  'min-h-10 w-full rounded-md border border-edge bg-sheet px-3 py-1.5 text-[16px] text-ink ' +
  'placeholder:text-ink-2 aria-invalid:border-danger aria-invalid:outline-danger sm:text-base ' +
  'disabled:cursor-not-allowed disabled:opacity-60';
