import type { CodeAction } from 'vscode-languageserver-protocol';
import type { TextRange } from '../core/report/problem.ts';
import { diagnostic } from './diagnostics.ts';
import type { Subject } from './subject.ts';

/** The fixes of every problem that the selection touches; a problem's only fix is the preferred one. */
export function codeActions(subject: Subject, selected: TextRange, checksUri: string | undefined): CodeAction[] {
  const { analysis, uri, toRange } = subject;
  return analysis.problems
    .filter(({ range }) => range.start <= selected.end && selected.start <= range.end)
    .flatMap((problem) => {
      const { fixes = [] } = problem;
      return fixes.map(
        ({ title, range, text }): CodeAction => ({
          title,
          kind: 'quickfix',
          diagnostics: [diagnostic(problem, toRange, checksUri)],
          isPreferred: fixes.length === 1,
          edit: { changes: { [uri]: [{ range: toRange(range), newText: text }] } },
        }),
      );
    });
}
