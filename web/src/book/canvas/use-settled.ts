import { useEffect, useState } from 'react';

/** Whether a value has stood still for a moment; false while it moves. */
export function useSettled(value: number, after_ms: number): boolean {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => {
      setSettled(value);
    }, after_ms);
    return () => {
      clearTimeout(timer);
    };
  }, [value, after_ms]);
  return settled === value;
}
