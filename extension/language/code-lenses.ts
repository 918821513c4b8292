import type { CodeLens } from 'vscode-languageserver-protocol';
import type { Subject } from './subject.ts';

export function codeLenses(_subject: Subject, _readoutCommand: string | undefined): CodeLens[] {
  return [];
}
