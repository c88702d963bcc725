import { useEffect, useState } from 'react';
import { useBook } from '../session/use-book.ts';

/** At most two sentences a second reach a screen reader. */
const PAUSE_MS = 500;

/** Says what was done on the plan, for those who do not see it. */
export function Announcer() {
  const announcement = useBook((state) => state.announcement);
  const [said, setSaid] = useState(announcement);
  useEffect(() => {
    const timer = setTimeout(() => {
      setSaid(announcement);
    }, PAUSE_MS);
    return () => {
      clearTimeout(timer);
    };
  }, [announcement]);
  return (
    <p role="status" className="unseen">
      {said.text}
      {said.count % 2 === 0 ? '' : '\u00a0'}
    </p>
  );
}
