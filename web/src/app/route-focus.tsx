import { useEffect, useRef, useState } from 'react';
import { useLocation } from 'react-router-dom';

/**
 * After a change of screen puts focus on its heading and says its title, so that somebody who does not see the screen
 * knows it changed. The first screen of a visit keeps the browser's own start.
 */
export function RouteFocus() {
  const { pathname } = useLocation();
  const before = useRef(pathname);
  const [said, setSaid] = useState('');
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    const heading = document.querySelector<HTMLElement>('main h1');
    const target = heading ?? document.querySelector<HTMLElement>('main');
    if (target !== null && !target.hasAttribute('tabindex')) target.tabIndex = -1;
    target?.focus({ preventScroll: true });
    window.scrollTo(0, 0);
    // The title is written by the page's own effect, which ran before this one.
    setSaid(document.title);
  }, [pathname]);
  return (
    <p aria-live="polite" className="unseen">
      {said}
    </p>
  );
}
