/** Tokens a chart may draw with; colour is never the only sign, a dash pattern goes with it. */
export type ChartTone = 'ink' | 'soft' | 'madder' | 'ochre' | 'verdigris';

/** A line of a chart. Points are in the units of the axes, left to right. */
export interface CurveSeries {
  readonly id: string;
  /** Written beside the line itself; charts carry no legend. */
  readonly label: string;
  readonly points: readonly (readonly [number, number])[];
  readonly tone: ChartTone;
  /** On and off lengths in px; empty for a solid line. */
  readonly dash: readonly number[];
  readonly filled?: boolean;
}

/** A level the curve is read against, drawn across the whole width. */
export interface CurveThreshold {
  readonly id: string;
  readonly label: string;
  readonly y: number;
  readonly tone: ChartTone;
  readonly dash: readonly number[];
}

/** A moment something happens at, drawn from top to bottom. */
export interface CurveMoment {
  readonly id: string;
  readonly label: string;
  readonly x: number;
  readonly tone: ChartTone;
  readonly dash: readonly number[];
}

/** A point worth naming, such as where the curve meets a threshold. */
export interface CurveMark {
  readonly x: number;
  readonly y: number;
  readonly tone: ChartTone;
}

export interface CurveAxis {
  /** What is measured, as a heading: "Time". */
  readonly label: string;
  /** As shown on the axis: "min". */
  readonly unit: string;
  /** Start of the column name in a saved file: "time"; the unit is added. */
  readonly column: string;
}

/** All a chart, its table and its saved file are made from, so that the three cannot disagree. */
export interface CurveChart {
  /** The takeaway in one sentence. */
  readonly title: string;
  /** What a person who does not see the lines needs to know. */
  readonly summary: string;
  readonly x: CurveAxis;
  readonly y: CurveAxis;
  readonly series: readonly CurveSeries[];
  readonly thresholds: readonly CurveThreshold[];
  readonly moments?: readonly CurveMoment[];
  readonly marks: readonly CurveMark[];
  /** Without extension. */
  readonly fileName: string;
}
