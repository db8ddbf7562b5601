import type { ComponentProps } from 'react';
import { buttonClasses, type ButtonLook } from './button-classes.ts';

type Props = Omit<ComponentProps<'button'>, 'className'> & {
  look?: ButtonLook;
  isSmall?: boolean;
  /** what it says while it is at work; it cannot be pressed again meanwhile */ busy?:
    string | false;
};

export const Button = ({ look = 'plain', isSmall, busy = false, onClick, ...rest }: Props) => (
  // Busy is announced, not disabled: a disabled button would drop the keyboard focus.
  <button
    type="button"
    {...rest}
    aria-disabled={busy !== false || undefined}
    onClick={busy === false ? onClick : (event) => event.preventDefault()}
    className={buttonClasses(look, isSmall)}
  >
    {busy === false ? rest.children : busy}
  </button>
);
