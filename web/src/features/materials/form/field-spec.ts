/** What was typed, by field; a field is named by its place in the draft: `runs/0/mass_kg`. */
export type Values = Readonly<Record<string, string>>;

export interface Option {
  readonly value: string;
  readonly label: string;
}

interface FieldBase {
  /** Place in the draft; inside rows, in one row. */
  readonly path: string;
  readonly label: string;
  readonly hint?: string;
  readonly optional?: true;
  /** Asked for only then; what was typed stays. */
  readonly when?: (values: Values) => boolean;
}

export interface TextSpec extends FieldBase {
  readonly as: 'text';
  readonly most: number;
  readonly lines?: 'several';
  readonly width?: 'short' | 'medium';
}

export interface NumberSpec extends FieldBase {
  readonly as: 'number';
  /** As laboratories write it; with `own`, read in the units of the person. */
  readonly unit: string;
  readonly own?: true;
  /** What one of `unit` is in the unit of the draft. */
  readonly factor?: number;
  /** Bounds in `unit`, both admitted. */
  readonly minimum?: number;
  readonly maximum?: number;
}

export interface ChoiceSpec extends FieldBase {
  readonly as: 'choice';
  readonly options: readonly Option[];
  /** Chosen at first; '' where nothing is said until somebody says it. */
  readonly start: string;
  /** Stands in the draft only beside this other field. */
  readonly with?: string;
}

/** Yes, no, or nothing said. */
export interface YesNoSpec extends FieldBase {
  readonly as: 'yes-no';
}

/** Several words, with commas between. */
export interface WordsSpec extends FieldBase {
  readonly as: 'words';
  readonly most: number;
}

/** Any of a few marks. */
export interface MarksSpec extends FieldBase {
  readonly as: 'marks';
  readonly options: readonly Option[];
}

/** A material of the catalogue, with its version where it is one of the organisation's own. */
export interface MaterialSpec extends FieldBase {
  readonly as: 'material';
  /** Where its version goes; absent: built-in materials only. */
  readonly version?: string;
}

export type FieldSpec = TextSpec | NumberSpec | ChoiceSpec | YesNoSpec | WordsSpec | MarksSpec | MaterialSpec;

export interface FieldSection {
  readonly title: string;
  readonly hint?: string;
  readonly when?: (values: Values) => boolean;
  readonly fields: readonly FieldSpec[];
  /** The fields are one line of a list that grows. */
  readonly rows?: {
    /** Place of the list in the draft. */
    readonly path: string;
    /** "Run" */
    readonly noun: string;
    readonly start: number;
    readonly most: number;
  };
  /** Folded away until it is asked for. */
  readonly folded?: true;
}

/** Name under which the number of lines of a list is kept. */
export const countName = (path: string): string => `${path}.count`;
/** Name under which the text typed to find a material is kept. */
export const findName = (path: string): string => `${path}.find`;
