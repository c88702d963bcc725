import { Link, type LinkProps } from 'react-router-dom';
import type { ButtonLook } from './button.tsx';

interface LinkButtonProps extends LinkProps {
  readonly look?: ButtonLook;
  readonly size?: 'small' | 'normal';
}

/** Goes somewhere and looks as important as a button. */
export function LinkButton({ look = 'secondary', size = 'normal', className, ...rest }: LinkButtonProps) {
  return <Link {...rest} className={`button ${className ?? ''}`} data-look={look} data-size={size} />;
}
