import type { ChartId } from './chart.ts';
import type { ExplorationState, ReadoutState } from './readout.ts';

/** Client to server: what the readout shows for an open document; `null` for one that is not open. */
export const readoutRequest = 'giantpulse/readout';

export interface ReadoutParams {
  readonly uri: string;
}

export type ReadoutResult = ReadoutState | null;

/** Client to server: curves and sensitivities of an open document. Cancelled when the document changes meanwhile. */
export const explorationRequest = 'giantpulse/exploration';

/** `null` for a document that is not open or has no prediction. */
export type ExplorationResult = ExplorationState | null;

/** Client to server: a chart as a file's text, or all figures as plain text. */
export const exportRequest = 'giantpulse/export';

export type ExportParams =
  | { readonly uri: string; readonly what: ChartId; readonly format: 'csv' | 'svg' }
  | { readonly uri: string; readonly what: 'figures'; readonly format: 'text' | 'csv' };

/** `null` where there is nothing of the kind to export. */
export type ExportResult = { readonly version: number; readonly text: string } | null;

/** Client to server: the text of a new design, complete but for the author's own figures. */
export const templateRequest = 'giantpulse/template';

export type TemplateResult = string;

/** Client to server: what is wrong with a text, as the command's `check` prints it. */
export const checkRequest = 'giantpulse/check';

export interface CheckParams {
  /** As the lines shall name it. */
  readonly file: string;
  readonly text: string;
}

export interface CheckResult {
  /** `file:line:column: severity: message [code]`. */
  readonly lines: readonly string[];
  readonly errors: number;
  readonly warnings: number;
  readonly notes: number;
  readonly accepted: number;
}

/** Server to client: the problems of this version are published, figures can be asked for. */
export const analysedNotification = 'giantpulse/analysed';

export interface AnalysedParams {
  readonly uri: string;
  readonly version: number;
  /** For the status bar: the pulse in a few words, or that there is none. */
  readonly headline: string;
  readonly errors: number;
  readonly warnings: number;
}

/** The client's `initializationOptions`; other editors may leave them out. */
export interface ServerOptions {
  /** Where `checks.md`, the explanation of every code, can be opened. */
  readonly checksUri?: string;
  /** The client's command that a code lens runs; without one a lens is only read. */
  readonly readoutCommand?: string;
  readonly settings?: Settings;
}

/** What a user can switch off, under `giantpulse` in the client's configuration. */
export interface Settings {
  /** The predicted pulse above the first line. */
  readonly codeLens: { readonly prediction: boolean };
  /** Derived values behind the keys that decide them. */
  readonly inlayHints: { readonly pump: boolean; readonly resonator: boolean; readonly qSwitch: boolean };
}

export const defaultSettings: Settings = {
  codeLens: { prediction: true },
  inlayHints: { pump: true, resonator: true, qSwitch: true },
};
