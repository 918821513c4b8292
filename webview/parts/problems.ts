import type { ProblemRow } from '../../extension/protocol/readout.ts';
import { element, prose } from '../dom.ts';

const severities = ['error', 'warning', 'information'] as const;
const marks: Readonly<Record<ProblemRow['severity'], string>> = { error: '✗', warning: '!', information: 'i' };

/** `2 errors, 1 warning`, or that there are none. */
export function countOf(problems: readonly ProblemRow[]): string {
  const counts = severities.flatMap((severity) => {
    const count = problems.filter((problem) => problem.severity === severity).length;
    if (count === 0) return [];
    const noun = severity === 'information' ? 'note' : severity;
    return [`${count} ${noun}${count === 1 ? '' : 's'}`];
  });
  return counts.length === 0 ? 'none' : counts.join(', ');
}

/** Each problem with a link to its line. */
export function problemList(problems: readonly ProblemRow[], reveal: (line: number) => void): HTMLElement {
  const items = problems.map(({ severity, code, message, line }) => {
    const link = element('button', { type: 'button', class: 'link' }, `line ${line}`);
    link.addEventListener('click', () => reveal(line));
    return element(
      'li',
      { class: severity },
      element('span', { class: 'mark', 'aria-hidden': 'true' }, marks[severity]),
      element('span', { class: 'unseen' }, `${severity}: `),
      element('span', {}, ...prose(message), ' ', element('code', { class: 'code' }, code), ' ', link),
    );
  });
  return element('ul', { class: 'problems' }, ...items);
}
