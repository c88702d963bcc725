import * as Ariakit from '@ariakit/react';
import type { ReactElement, ReactNode } from 'react';

interface MenuProps {
  /** What the button shows. */
  readonly button: ReactNode;
  /** What the button is called when what it shows is not words. */
  readonly label: string;
  readonly look?: 'secondary' | 'quiet';
  readonly children: ReactNode;
}

/** A button that opens a short list of things to do. Arrow keys move, letters jump, Escape closes. */
export function Menu({ button, label, look = 'quiet', children }: MenuProps) {
  return (
    <Ariakit.MenuProvider>
      <Ariakit.MenuButton className="button" data-look={look} aria-label={label}>
        {button}
      </Ariakit.MenuButton>
      <Ariakit.Menu className="menu" gutter={6} portal aria-label={label}>
        {children}
      </Ariakit.Menu>
    </Ariakit.MenuProvider>
  );
}

interface MenuItemProps {
  readonly children: ReactNode;
  readonly onChoose?: () => void;
  /** A link, where the item goes somewhere. */
  readonly render?: ReactElement;
}

export function MenuItem({ children, onChoose, render }: MenuItemProps) {
  return (
    <Ariakit.MenuItem
      className="menu-item"
      {...(onChoose === undefined ? {} : { onClick: onChoose })}
      {...(render === undefined ? {} : { render })}
    >
      {children}
    </Ariakit.MenuItem>
  );
}
