import type { RequirementRow, SurfaceRow, Verdict } from '../../extension/protocol/readout.ts';
import { element, quantity, scrolling } from '../dom.ts';

const absent = '—';
const marks: Readonly<Record<Verdict, string>> = { good: '✓', look: '!', bad: '✗', unknown: '?' };

type Words = Readonly<Record<Verdict, string>>;
const surfaceWords: Words = {
  good: 'holds',
  look: 'below wanted margin',
  bad: 'over threshold',
  unknown: 'not judged',
};
const requirementWords: Words = { good: 'met', look: 'near', bad: 'missed', unknown: 'not predicted' };

/** A mark and a word: the colour only repeats what they say. */
function verdictCell(verdict: Verdict, words: Words): HTMLElement {
  const mark = element('span', { class: 'mark', 'aria-hidden': 'true' }, marks[verdict]);
  return element('span', { class: `verdict ${verdict}` }, mark, ` ${words[verdict]}`);
}

export function surfaceTable(rows: readonly SurfaceRow[]): HTMLElement {
  const columns = [
    { heading: 'Surface' },
    { heading: 'Peak fluence', numeric: true },
    { heading: 'Threshold', numeric: true },
    { heading: 'Margin', numeric: true },
    { heading: 'Verdict' },
  ];
  return scrolling(
    'Peak fluence on each surface against its damage threshold, scaled to this pulse',
    columns,
    rows.map(({ name, fluence, threshold, margin, verdict }) => [
      name,
      quantity(fluence),
      quantity(threshold ?? absent),
      quantity(margin ?? absent),
      verdictCell(verdict, surfaceWords),
    ]),
  );
}

export function requirementTable(rows: readonly RequirementRow[]): HTMLElement {
  const columns = [
    { heading: 'Requirement' },
    { heading: 'Required', numeric: true },
    { heading: 'Predicted', numeric: true },
    { heading: 'Verdict' },
  ];
  return scrolling(
    'Each requirement against the prediction',
    columns,
    rows.map(({ name, required, predicted, verdict }) => [
      name,
      quantity(required),
      quantity(predicted ?? absent),
      verdictCell(verdict, requirementWords),
    ]),
  );
}
