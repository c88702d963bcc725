import { useEffect, useState } from 'react';
import { useThemeRevision } from '../../lib/theme-tokens.ts';
import { readPalette, type Palette } from './palette.ts';

/** The plan's colours, read again when the theme changes. */
export function usePalette(): Palette {
  const revision = useThemeRevision();
  const [palette, setPalette] = useState(readPalette);
  useEffect(() => {
    setPalette(readPalette());
  }, [revision]);
  return palette;
}
