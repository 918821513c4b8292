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

/** A mark and a word: the colour only repeats what they say. Beside the name, so that a narrow page shows it first. */
function verdictCell(verdict: Verdict, words: Words): HTMLElement {
  const mark = element('span', { class: 'mark', 'aria-hidden': 'true' }, marks[verdict]);
  return element('span', { class: `verdict ${verdict}` }, mark, element('span', {}, words[verdict]));
}

export function surfaceTable(rows: readonly SurfaceRow[]): HTMLElement {
  const columns = [
    { heading: 'Surface' },
    { heading: 'Verdict' },
    { heading: 'Peak fluence', numeric: true },
    { heading: 'Threshold', numeric: true },
    { heading: 'Margin', numeric: true },
  ];
  return scrolling(
    'Peak fluence on each surface against its damage threshold, scaled to this pulse',
    columns,
    rows.map(({ name, fluence, threshold, margin, verdict }) => [
      name,
      verdictCell(verdict, surfaceWords),
      quantity(fluence),
      quantity(threshold ?? absent),
      quantity(margin ?? absent),
    ]),
  );
}

export function requirementTable(rows: readonly RequirementRow[]): HTMLElement {
  const columns = [
    { heading: 'Requirement' },
    { heading: 'Verdict' },
    { heading: 'Required', numeric: true },
    { heading: 'Predicted', numeric: true },
  ];
  return scrolling(
    'Each requirement against the prediction',
    columns,
    rows.map(({ name, required, predicted, verdict }) => [
      name,
      verdictCell(verdict, requirementWords),
      quantity(required),
      quantity(predicted ?? absent),
    ]),
  );
}
