import type { CompletionItem } from 'vscode-languageserver-protocol';
import type { Subject } from '../subject.ts';

export function completion(_subject: Subject, _offset: number): CompletionItem[] {
  return [];
}
