import type { ProblemRow } from '../../extension/protocol/readout.ts';
import { element, prose } from '../dom.ts';

const severities = ['error', 'warning', 'information'] as const;
const marks: Readonly<Record<ProblemRow['severity'], string>> = { error: '✗', warning: '!', information: 'i' };

/** `2 errors, 1 warning`, or that there are none. */
export function countOf(problems: readonly ProblemRow[]): string {
  const accepted = problems.filter((problem) => problem.accepted !== undefined).length;
  const counts = severities.flatMap((severity) => {
    const count = problems.filter((problem) => problem.severity === severity && problem.accepted === undefined).length;
    if (count === 0) return [];
    const noun = severity === 'information' ? 'note' : severity;
    return [`${count} ${noun}${count === 1 ? '' : 's'}`];
  });
  if (accepted > 0) counts.push(`${accepted} accepted`);
  return counts.length === 0 ? 'none' : counts.join(', ');
}

/** Each problem with a link to its line. */
export function problemList(problems: readonly ProblemRow[], reveal: (line: number) => void): HTMLElement {
  const items = problems.map(({ severity, code, message, line, accepted }) => {
    const link = element('button', { type: 'button', class: 'link' }, `line ${line}`);
    link.addEventListener('click', () => reveal(line));
    return element(
      'li',
      { class: severity },
      element('span', { class: 'mark', 'aria-hidden': 'true' }, accepted === undefined ? marks[severity] : '✓'),
      element('span', { class: 'unseen' }, `${severity}: `),
      element(
        'span',
        {},
        ...prose(message),
        ...reasonOf(accepted),
        ' ',
        element('code', { class: 'code' }, code),
        ' ',
        link,
      ),
    );
  });
  return element('ul', { class: 'problems' }, ...items);
}

/** Why the design's author accepts it. */
function reasonOf(accepted: string | undefined): readonly (Node | string)[] {
  return accepted === undefined ? [] : [' ', element('strong', {}, 'Accepted: '), accepted];
}
