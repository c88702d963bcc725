import { createContext } from 'react';
import { SpreadPlay } from './spread-play.ts';

/** Before every picture the browser draws. */
export const browserFrame = (callback: (now_ms: number) => void): (() => void) => {
  const asked = requestAnimationFrame(callback);
  return () => {
    cancelAnimationFrame(asked);
  };
};

/** What is played on the plan of the open Book. */
export const SpreadPlayContext = createContext(new SpreadPlay(browserFrame));
