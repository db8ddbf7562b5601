export type ButtonLook = 'main' | 'plain' | 'danger' | 'quiet';

const looks: Record<ButtonLook, string> = {
  main: 'border-transparent bg-act text-on-act hover:brightness-110',
  plain: 'border-edge bg-sheet text-act hover:bg-act-tint',
  danger: 'border-danger bg-sheet text-danger hover:bg-danger-tint',
  quiet: 'border-transparent text-act underline underline-offset-2 hover:bg-act-tint',
};

/** One look for buttons and for links that stand where a button would. The border is for forced colours. */
export const buttonClasses = (look: ButtonLook, isSmall = false): string =>
  [
    'inline-flex items-center justify-center gap-2 rounded-md border font-semibold',
    'disabled:cursor-not-allowed disabled:opacity-60 aria-disabled:opacity-60',
    isSmall ? 'min-h-8 px-2.5 text-sm' : 'min-h-10 px-4 text-base',
    looks[look],
  ].join(' ');
