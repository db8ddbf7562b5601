/** A line in an opened list, link or button. */
export const menuItemClasses =
  'flex min-h-9 w-full items-center rounded px-3 text-left text-ink hover:bg-act-tint aria-[current=page]:font-bold aria-[current=page]:text-act';
