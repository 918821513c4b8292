import { createPositions } from './position.ts';
import type { Problem } from './problem.ts';

/** One line a finding: `file:line:column: severity: message [code]`. */
export function findingLines(file: string, text: string, problems: readonly Problem[]): string[] {
  const positionAt = createPositions(text);
  return problems.map(({ range, severity, message, code }) => {
    const { line, column } = positionAt(range.start);
    return `${file}:${line}:${column}: ${severity}: ${message.replace(/\s+/g, ' ')} [${code}]`;
  });
}

/** How many of each severity: `2 errors, 1 warning`. */
export function countText(problems: readonly Problem[]): string {
  const count = (severity: Problem['severity']) => problems.filter((p) => p.severity === severity).length;
  const plural = (n: number, word: string) => `${n} ${word}${n === 1 ? '' : 's'}`;
  const notes = count('information');
  return `${plural(count('error'), 'error')}, ${plural(count('warning'), 'warning')}${notes ? `, ${plural(notes, 'note')}` : ''}`;
}
