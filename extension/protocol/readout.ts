/** What the readout shows, already in words and display units: the page lays it out and calculates nothing. */
export interface ReadoutState {
  readonly uri: string;
  /** The document's version that every figure below was predicted from. */
  readonly version: number;
  readonly title: string;
  /** Which path produced the pulse, in words. */
  readonly model?: string;
  /** Why there is no pulse to show; absent when there is one. */
  readonly absence?: string;
  /** The figures an engineer looks for first; the same ones in the same order, whether or not they have a value. */
  readonly headline: readonly Figure[];
  readonly groups: readonly FigureGroup[];
  readonly waveform?: WaveformChart;
  readonly surfaces: readonly SurfaceRow[];
  readonly requirements: readonly RequirementRow[];
  readonly validity: readonly string[];
  readonly problems: readonly ProblemRow[];
}

export interface Figure {
  readonly label: string;
  /** With its unit, e.g. `13.1 mJ`; absent where the figure does not apply. */
  readonly value?: string;
}

export interface FigureGroup {
  readonly name: string;
  readonly figures: readonly Figure[];
}

/** Arrays of one length. */
export interface WaveformChart {
  readonly timeUnit: string;
  readonly time: readonly number[];
  readonly powerUnit: string;
  readonly power: readonly number[];
  /** 1 before the pulse. */
  readonly inversion: readonly number[];
  /** The chart in a sentence, for those who don't see it. */
  readonly summary: string;
}

/** `good`: nothing to say; `look`: a warning; `bad`: an error; `unknown`: the model does not predict it. */
export type Verdict = 'good' | 'look' | 'bad' | 'unknown';

export interface SurfaceRow {
  readonly name: string;
  readonly fluence: string;
  readonly threshold?: string;
  readonly margin?: string;
  readonly verdict: Verdict;
}

export interface RequirementRow {
  readonly name: string;
  readonly required: string;
  readonly predicted?: string;
  readonly verdict: Verdict;
}

export interface ProblemRow {
  readonly severity: 'error' | 'warning' | 'information';
  readonly code: string;
  readonly message: string;
  /** As the editor counts them, from 1. */
  readonly line: number;
}
