import type { Location } from 'vscode-languageserver-protocol';
import type { Subject } from './subject.ts';

export function definition(_subject: Subject, _offset: number): Location | undefined {
  return undefined;
}
