import type { ChartId } from './chart.ts';
import type { ExplorationState, Pinned, ReadoutState } from './readout.ts';

/** What the editor tells the readout's page. */
export type HostMessage =
  /** `pinned`: the state to compare with, as long as there is one. */
  | { readonly type: 'state'; readonly state: ReadoutState; readonly pinned?: Pinned }
  | { readonly type: 'exploration'; readonly exploration: ExplorationState }
  /** The cursor stands on this line (from 1) of the design shown. */
  | { readonly type: 'cursor'; readonly line: number }
  /** There is nothing to show, and this is why. */
  | { readonly type: 'unavailable'; readonly reason: string };

/** What the readout's page asks of the editor. */
export type PageMessage =
  /** The page listens now: send the state. */
  | { readonly type: 'ready' }
  /** Keep what is shown to compare with, or stop comparing. */
  | { readonly type: 'pin'; readonly pin: boolean }
  /** Put all figures on the clipboard as text. */
  | { readonly type: 'copy' }
  | { readonly type: 'export'; readonly chart: ChartId; readonly format: 'csv' | 'svg' }
  /** A chart as the page drew it: a PNG as a data URL. */
  | { readonly type: 'picture'; readonly chart: ChartId; readonly data: string }
  /** Show this line of the text; lines count from 1. */
  | { readonly type: 'reveal'; readonly line: number };

/** What the page keeps while it is hidden and over a reload of the window. */
export interface PageMemory {
  readonly uri: string;
  /** Charts whose data table is open. */
  readonly tables: readonly ChartId[];
}

/** Closes a `switch` over a union: a member without its case does not compile. */
export function unreachable(value: never): never {
  throw new Error(`unexpected message: ${JSON.stringify(value)}`);
}
