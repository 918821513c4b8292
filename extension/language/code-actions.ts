import type { CodeAction } from 'vscode-languageserver-protocol';
import type { Analysis } from '../core/analyse.ts';
import type { TextRange } from '../core/report/problem.ts';
import { diagnostic } from './diagnostics.ts';
import type { ToRange } from './range.ts';

export interface CodeActionContext {
  readonly uri: string;
  readonly toRange: ToRange;
  readonly checksUri: string | undefined;
}

/** The fixes of every problem that the selection touches; a problem's only fix is the preferred one. */
export function codeActions(analysis: Analysis, selected: TextRange, context: CodeActionContext): CodeAction[] {
  return analysis.problems
    .filter(({ range }) => range.start <= selected.end && selected.start <= range.end)
    .flatMap((problem) => {
      const { fixes = [] } = problem;
      return fixes.map(
        ({ title, range, text }): CodeAction => ({
          title,
          kind: 'quickfix',
          diagnostics: [diagnostic(problem, context.toRange, context.checksUri)],
          isPreferred: fixes.length === 1,
          edit: { changes: { [context.uri]: [{ range: context.toRange(range), newText: text }] } },
        }),
      );
    });
}
