import { readToken } from '../../lib/theme-tokens.ts';
import type { ChartTone } from './curve-chart.ts';

export interface ChartColours {
  readonly tones: Readonly<Record<ChartTone, string>>;
  readonly page: string;
  /** Behind a filled curve. */
  readonly fill: string;
}

/**
 * The colours in force now: a canvas cannot follow CSS variables by itself.
 *
 * @param _revision of the theme, so that callers who memoise read again when it rises
 */
export function chartColours(_revision: number): ChartColours {
  return {
    tones: {
      ink: readToken('ink'),
      soft: readToken('soft'),
      madder: readToken('madder'),
      ochre: readToken('ochre'),
      verdigris: readToken('verdigris'),
    },
    page: readToken('page'),
    fill: `${readToken('load-2')}40`,
  };
}
