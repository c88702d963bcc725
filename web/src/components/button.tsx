import type { ComponentPropsWithRef } from 'react';

export type ButtonLook = 'primary' | 'secondary' | 'quiet' | 'destructive';

interface ButtonProps extends ComponentPropsWithRef<'button'> {
  readonly look?: ButtonLook;
  readonly size?: 'small' | 'normal';
  /** Work is under way: the press is not taken twice, and a reader hears "busy". The button is never disabled. */
  readonly busy?: boolean;
}

/** Does something. To go somewhere use `LinkButton` or a link. */
export function Button({
  look = 'secondary',
  size = 'normal',
  busy = false,
  className,
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      className={`button ${className ?? ''}`}
      data-look={look}
      data-size={size}
      aria-busy={busy || undefined}
      onClick={(event) => {
        if (busy) event.preventDefault();
        else onClick?.(event);
      }}
    />
  );
}
