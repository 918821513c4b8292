import type { CodeAction } from 'vscode-languageserver-protocol';
import { acceptanceFix, isAcceptable } from '../core/checks/acceptance.ts';
import type { Fix, Problem, TextRange } from '../core/report/problem.ts';
import { diagnostic } from './diagnostics.ts';
import { conversions } from './fixes/convert-unit.ts';
import { optimumFix } from './fixes/optimum.ts';
import { solvedFixes } from './fixes/solved.ts';
import type { Subject } from './subject.ts';

/**
 * What can be done about the problems that the selection touches, the surest first, and what can be rewritten where
 * the cursor stands. A problem's only written-down fix is the preferred one; solved values are the author's choice.
 */
export function codeActions(subject: Subject, selected: TextRange, checksUri: string | undefined): CodeAction[] {
  const { analysis, uri, toRange, text } = subject;
  const action = ({ title, range, text: newText }: Fix, more: Partial<CodeAction>): CodeAction => ({
    title,
    ...more,
    edit: { changes: { [uri]: [{ range: toRange(range), newText }] } },
  });
  const touched = analysis.problems.filter(({ range }) => range.start <= selected.end && selected.start <= range.end);
  const mending = touched.flatMap((problem) => {
    const { fixes = [] } = problem;
    const about = { kind: 'quickfix', diagnostics: [diagnostic(subject, problem, checksUri)] };
    return [
      ...fixes.map((fix) => action(fix, { ...about, isPreferred: fixes.length === 1 })),
      ...solvedFixes(subject, problem).map((fix) => action(fix, about)),
    ];
  });
  const accepting = touched.filter(isOpen).map((problem) =>
    action(acceptanceFix(text, problem), {
      kind: 'quickfix',
      diagnostics: [diagnostic(subject, problem, checksUri)],
    }),
  );
  const rewriting = rewritings(subject, selected).map((fix) => action(fix, { kind: 'refactor.rewrite' }));
  return [...mending, ...accepting, ...rewriting];
}

function isOpen({ code, severity, accepted }: Problem): boolean {
  return accepted === undefined && severity !== 'information' && isAcceptable(code);
}

function rewritings(subject: Subject, { start, end }: TextRange): Fix[] {
  const { design } = subject.analysis;
  const node = design.nodeAt(start);
  if (node === undefined || node !== design.nodeAt(end) || node.kind !== 'scalar') return [];
  const optimum = node.path === 'resonator.output_reflectivity' ? optimumFix(subject) : undefined;
  return [...(optimum ? [optimum] : []), ...conversions(subject, node.path)];
}
