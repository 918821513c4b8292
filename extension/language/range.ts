import type { Position, Range } from 'vscode-languageserver-protocol';
import type { TextRange } from '../core/report/problem.ts';

export type ToRange = (range: TextRange) => Range;

/** Offsets of a document's text into its lines and characters. */
export function rangeIn(document: { positionAt(offset: number): Position }): ToRange {
  return ({ start, end }) => ({ start: document.positionAt(start), end: document.positionAt(end) });
}
