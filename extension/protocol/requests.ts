import type { ReadoutState } from './readout.ts';

/** Client to server: what the readout shows for an open document; `null` for one that is not open. */
export const readoutRequest = 'giantpulse/readout';

export interface ReadoutParams {
  readonly uri: string;
}

export type ReadoutResult = ReadoutState | null;

/** Server to client: the problems of this version are published, figures can be asked for. */
export const analysedNotification = 'giantpulse/analysed';

export interface AnalysedParams {
  readonly uri: string;
  readonly version: number;
}

/** The client's `initializationOptions`; other editors may leave them out. */
export interface ServerOptions {
  /** Where `checks.md`, the explanation of every code, can be opened. */
  readonly checksUri?: string;
}
