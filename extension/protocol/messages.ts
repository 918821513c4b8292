import type { ReadoutState } from './readout.ts';

/** What the editor tells the readout's page. */
export type HostMessage =
  | { readonly type: 'state'; readonly state: ReadoutState }
  /** There is nothing to show, and this is why. */
  | { readonly type: 'unavailable'; readonly reason: string };

/** What the readout's page asks of the editor. */
export type PageMessage =
  /** The page listens now: send the state. */
  | { readonly type: 'ready' }
  | { readonly type: 'copy'; readonly text: string }
  /** Show a problem's line in the text; lines count from 1. */
  | { readonly type: 'reveal'; readonly line: number };

/** What the page keeps while it is hidden and over a reload of the window. */
export interface PageMemory {
  readonly uri: string;
  readonly tableShown: boolean;
}

/** Closes a `switch` over a union: a member without its case does not compile. */
export function unreachable(value: never): never {
  throw new Error(`unexpected message: ${JSON.stringify(value)}`);
}
