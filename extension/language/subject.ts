import type { Position } from 'vscode-languageserver-protocol';
import type { Analysis } from '../core/analyse.ts';
import type { Explorer } from '../core/explore/explorer.ts';
import type { ToRange } from './range.ts';

/** One version of a document with all that is known of it: what every editor feature is a function of. */
export interface Subject {
  readonly uri: string;
  readonly version: number;
  readonly text: string;
  readonly analysis: Analysis;
  readonly explorer: Explorer;
  readonly toRange: ToRange;
  offsetAt(position: Position): number;
}
