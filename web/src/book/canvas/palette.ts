import { readToken } from '../../lib/theme-tokens.ts';

/** The colours the plan is drawn with, read from the tokens of the theme in force. */
export interface Palette {
  readonly paper: string;
  readonly page: string;
  readonly ink: string;
  readonly soft: string;
  readonly rule: string;
  readonly indigo: string;
  readonly verdigris: string;
  readonly ochre: string;
  readonly madder: string;
  readonly load: readonly string[];
}

export function readPalette(): Palette {
  return {
    paper: readToken('paper'),
    page: readToken('page'),
    ink: readToken('ink'),
    soft: readToken('soft'),
    rule: readToken('rule'),
    indigo: readToken('indigo'),
    verdigris: readToken('verdigris'),
    ochre: readToken('ochre'),
    madder: readToken('madder'),
    load: [0, 1, 2, 3, 4, 5].map((band) => readToken(`load-${band}`)),
  };
}
