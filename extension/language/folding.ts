import type { FoldingRange } from 'vscode-languageserver-protocol';
import type { Subject } from './subject.ts';

export function foldingRanges(_subject: Subject): FoldingRange[] {
  return [];
}
