import { Link, type LinkProps } from 'react-router-dom';
import { buttonClasses, type ButtonLook } from './button-classes.ts';

type Props = Omit<LinkProps, 'className'> & { look?: ButtonLook; isSmall?: boolean };

export const ButtonLink = ({ look = 'plain', isSmall, ...rest }: Props) => (
  <Link {...rest} className={buttonClasses(look, isSmall)} />
);
