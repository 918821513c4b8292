import type { InlayHint } from 'vscode-languageserver-protocol';
import type { TextRange } from '../core/report/problem.ts';
import type { Settings } from '../protocol/requests.ts';
import type { Subject } from './subject.ts';

export function inlayHints(_subject: Subject, _shown: TextRange, _settings: Settings['inlayHints']): InlayHint[] {
  return [];
}
