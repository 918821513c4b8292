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

/** How many of each severity, and how many accepted: `2 errors, 1 warning, 1 accepted`. */
export function countText(problems: readonly Problem[]): string {
  const accepted = problems.filter((p) => p.accepted !== undefined).length;
  const open = problems.filter((p) => p.accepted === undefined);
  const count = (severity: Problem['severity']) => open.filter((p) => p.severity === severity).length;
  const plural = (n: number, word: string) => `${n} ${word}${n === 1 ? '' : 's'}`;
  const notes = count('information');
  return `${plural(count('error'), 'error')}, ${plural(count('warning'), 'warning')}${notes ? `, ${plural(notes, 'note')}` : ''}${accepted ? `, ${accepted} accepted` : ''}`;
}
