import type { Range } from 'vscode-languageserver-protocol';
import type { TextRange } from '../core/report/problem.ts';

/** Offsets of a document's text into its lines and characters. */
export type ToRange = (range: TextRange) => Range;
