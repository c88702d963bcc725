import { useEffect, useState } from 'react';
import { PLATE_FONTS } from './paint-plates.ts';

/** Whether the plan's fonts are here: words measured before are measured again with them. */
export function useFontsReady(): boolean {
  const [ready, setReady] = useState(false);
  useEffect(() => {
    let left = false;
    const done = () => {
      if (!left) setReady(true);
    };
    // A font that cannot be fetched leaves the system's; its words are measured as they are drawn.
    Promise.all(Object.values(PLATE_FONTS.usual).map((font) => document.fonts.load(font))).then(done, done);
    return () => {
      left = true;
    };
  }, []);
  return ready;
}
