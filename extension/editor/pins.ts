import type { Memento } from 'vscode';
import { isPinned } from '../protocol/guard.ts';
import type { Pinned } from '../protocol/readout.ts';

/** States to compare with, one a design; kept with the workspace, so that they outlive panel and window. */
export interface Pins {
  of(uri: string): Pinned | undefined;
  keep(uri: string, pinned: Pinned): Thenable<void>;
  drop(uri: string): Thenable<void>;
}

export function createPins(memento: Memento): Pins {
  const key = (uri: string): string => `pinned ${uri}`;
  return {
    of(uri) {
      const pinned: unknown = memento.get(key(uri));
      return isPinned(pinned) ? pinned : undefined;
    },
    keep: (uri, pinned) => memento.update(key(uri), pinned),
    drop: (uri) => memento.update(key(uri), undefined),
  };
}
