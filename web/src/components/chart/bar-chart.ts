import type { ChartTone } from './curve-chart.ts';

/** One bar; its value is in the unit of the chart. */
export interface Bar {
  readonly id: string;
  readonly label: string;
  readonly value: number;
  readonly tone: ChartTone;
}

/** All a bar chart and its saved file are made from. */
export interface BarChart {
  /** The takeaway in one sentence. */
  readonly title: string;
  /** What a person who does not see the bars needs to know. */
  readonly summary: string;
  /** What is measured, as a heading, and its unit. */
  readonly label: string;
  readonly unit: string;
  /** Name of the value's column in a saved file, unit included: `share_percent`. */
  readonly column: string;
  /** From top to bottom. */
  readonly bars: readonly Bar[];
  /** Without extension. */
  readonly fileName: string;
}
