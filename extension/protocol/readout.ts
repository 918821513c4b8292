import type { Chart } from './chart.ts';

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
  /** Those that cost nothing beyond the prediction: the waveform and the surfaces, where there are any. */
  readonly charts: readonly Chart[];
  readonly surfaces: readonly SurfaceRow[];
  readonly requirements: readonly RequirementRow[];
  readonly validity: readonly string[];
  readonly problems: readonly ProblemRow[];
}

export interface Figure {
  readonly label: string;
  /** With its unit, e.g. `13.1 mJ`; absent where the figure does not apply. */
  readonly value?: string;
  /** The same in SI, to be compared with another state's. */
  readonly amount?: number;
}

export interface FigureGroup {
  readonly name: string;
  readonly figures: readonly Figure[];
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
  /** Why the design's author accepts it. */
  readonly accepted?: string;
  readonly code: string;
  readonly message: string;
  /** As the editor counts them, from 1. */
  readonly line: number;
}

/** What takes more predictions than one, and so comes a little later than the state of the same version. */
export interface ExplorationState {
  readonly uri: string;
  readonly version: number;
  /** Energy and width against output reflectivity, pump and repetition rate. */
  readonly charts: readonly Chart[];
  /** In the order of the file. */
  readonly parameters: readonly ParameterRow[];
}

/** A value of the design and what +1 % of it does. */
export interface ParameterRow {
  readonly path: string;
  /** As the file writes it. */
  readonly value: string;
  /** As the editor counts them, from 1. */
  readonly line: number;
  /** Signed percentages such as `+0.83 %`; absent where there is nothing to tell. */
  readonly energy?: string;
  readonly peak?: string;
  readonly width?: string;
  readonly margin?: string;
}

/** A state kept to be compared with: it outlives the page, the panel and the window. */
export interface Pinned {
  readonly state: ReadoutState;
  readonly exploration?: ExplorationState;
}
