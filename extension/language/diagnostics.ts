import type { Diagnostic, DiagnosticSeverity } from 'vscode-languageserver-protocol';
import { toldMessage } from '../core/report/findings-text.ts';
import type { Problem, Severity } from '../core/report/problem.ts';
import { relatedTo } from './related.ts';
import type { Subject } from './subject.ts';

/** LSP's numbers: 1 error, 2 warning, 3 information. */
const severities: Readonly<Record<Severity, DiagnosticSeverity>> = { error: 1, warning: 2, information: 3 };

/** Every problem of the analysis; `checksUri` is where the sections that explain the codes can be opened. */
export function diagnostics(subject: Subject, checksUri?: string): Diagnostic[] {
  return subject.analysis.problems.map((problem) => diagnostic(subject, problem, checksUri));
}

/** The same with the places that each problem hangs on, which takes more predictions; undefined where there are none. */
export function relatedDiagnostics(subject: Subject, checksUri?: string): Diagnostic[] | undefined {
  const found = subject.analysis.problems.map((problem) => ({ problem, related: relatedTo(subject, problem) }));
  if (found.every(({ related }) => related.length === 0)) return undefined;
  return found.map(({ problem, related }) => ({
    ...diagnostic(subject, problem, checksUri),
    ...(related.length > 0 && {
      relatedInformation: related.map(({ range, message }) => ({
        location: { uri: subject.uri, range: subject.toRange(range) },
        message,
      })),
    }),
  }));
}

export function diagnostic({ toRange }: Subject, problem: Problem, checksUri?: string): Diagnostic {
  return {
    range: toRange(problem.range),
    severity: severities[problem.severity],
    source: 'Giant Pulse',
    message: toldMessage(problem),
    ...codeOf(problem.code, checksUri),
  };
}

/** A fault of ours is shown on the first line: silence would look like a clean design. */
export function internalFailure(reason: string, checksUri?: string): Diagnostic {
  return {
    range: { start: { line: 0, character: 0 }, end: { line: 0, character: 1 } },
    severity: severities.error,
    source: 'Giant Pulse',
    message: `${failureMessage(reason)} The design has not been checked.`,
    ...codeOf('internal-failure', checksUri),
  };
}

export function failureMessage(reason: string): string {
  return `Giant Pulse failed on this design (${reason}). This is a fault of the program: please report it with the file.`;
}

/** Each code is also the anchor of the section that explains it. */
function codeOf(code: string, checksUri: string | undefined): Pick<Diagnostic, 'code' | 'codeDescription'> {
  return checksUri === undefined ? { code } : { code, codeDescription: { href: `${checksUri}#${code}` } };
}
