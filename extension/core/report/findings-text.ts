import { createPositions } from './position.ts';
import type { Problem } from './problem.ts';

/** One line a finding: `file:line:column: severity: message [code]`. */
export function findingLines(file: string, text: string, problems: readonly Problem[]): string[] {
  const positionAt = createPositions(text);
  return problems.map((problem) => {
    const { line, column } = positionAt(problem.range.start);
    return `${file}:${line}:${column}: ${problem.severity}: ${toldMessage(problem).replace(/\s+/g, ' ')} [${problem.code}]`;
  });
}

/** The message, with the reason where the design accepts it. */
export function toldMessage({ message, accepted }: Problem): string {
  return accepted === undefined ? message : `${message} Accepted: ${accepted.reason}`;
}

export interface Counts {
  readonly errors: number;
  readonly warnings: number;
  readonly notes: number;
  readonly accepted: number;
}

/** How many of each severity; what is accepted counts as nothing else. */
export function countsOf(problems: readonly Problem[]): Counts {
  const open = problems.filter(({ accepted }) => accepted === undefined);
  const count = (severity: Problem['severity']) => open.filter((problem) => problem.severity === severity).length;
  return {
    errors: count('error'),
    warnings: count('warning'),
    notes: count('information'),
    accepted: problems.length - open.length,
  };
}

/** `2 errors, 1 warning, 1 accepted`. */
export function countText(problems: readonly Problem[]): string {
  const { errors, warnings, notes, accepted } = countsOf(problems);
  const plural = (n: number, word: string) => `${n} ${word}${n === 1 ? '' : 's'}`;
  return `${plural(errors, 'error')}, ${plural(warnings, 'warning')}${notes ? `, ${plural(notes, 'note')}` : ''}${accepted ? `, ${accepted} accepted` : ''}`;
}
