import type { DocumentSymbol } from 'vscode-languageserver-protocol';
import type { Subject } from './subject.ts';

export function documentSymbols(_subject: Subject): DocumentSymbol[] {
  return [];
}
