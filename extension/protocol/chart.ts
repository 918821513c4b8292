/** What an axis shows: numbers in a display unit (`ns`, `mJ`, `%`); `scale` is that unit in SI, so that two charts can be overlaid. */
export interface Axis {
  readonly label: string;
  readonly unit: string;
  readonly scale: number;
}

export const chartIds = ['waveform', 'reflectivity', 'pump', 'repetition_rate', 'surfaces'] as const;

export type ChartId = (typeof chartIds)[number];

/** One or two quantities over one; the arrays of `x` and of every line have one length. */
export interface LineChart {
  readonly kind: 'lines';
  readonly id: ChartId;
  readonly title: string;
  readonly x: Axis & { readonly values: readonly number[]; readonly logarithmic: boolean };
  readonly left: Axis;
  readonly right: Axis;
  readonly lines: readonly Line[];
  readonly marks: readonly Mark[];
  /** The chart in a sentence or two, for those who don't see it. */
  readonly summary: string;
}

export interface Line {
  readonly label: string;
  readonly axis: 'left' | 'right';
  readonly values: readonly number[];
}

/** A place on the x axis worth seeing: where the design stands, where it would be best. */
export interface Mark {
  readonly kind: 'present' | 'optimum';
  /** With its value, e.g. `optimum 47.2 %`. */
  readonly label: string;
  readonly x: number;
}

/** Fluence against threshold, a bar a surface. */
export interface BarChart {
  readonly kind: 'bars';
  readonly id: ChartId;
  readonly title: string;
  readonly axis: Axis;
  readonly bars: readonly Bar[];
  readonly summary: string;
}

export interface Bar {
  readonly label: string;
  /** Peak fluence, hot spots counted. */
  readonly value: number;
  /** Where damage begins; absent where it can't be told. */
  readonly limit?: number;
  /** The most that keeps the wanted safety factor. */
  readonly wanted?: number;
  readonly verdict: 'good' | 'look' | 'bad' | 'unknown';
}

export type Chart = LineChart | BarChart;
