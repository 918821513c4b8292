import { CAUTION } from '../../core/report/caution.ts';
import type { Figure, ReadoutState } from '../../protocol/readout.ts';
import { csv } from './csv.ts';

/** The figures of a readout as plain text, one a line, for a report or a message. */
export function figuresText(state: ReadoutState): string {
  const lines = figuresOf(state).map(({ label, value }) => `${label}: ${value ?? ''}`);
  const surfaces = state.surfaces.map(({ name, fluence, threshold, margin }) => {
    const against = threshold === undefined ? '' : ` against ${threshold}`;
    return `${name}: ${fluence}${against}${margin === undefined ? '' : `, margin ${margin}`}`;
  });
  const requirements = state.requirements.map(({ name, required, predicted, verdict }) => {
    const met = { good: 'met', look: 'near', bad: 'missed', unknown: 'not predicted' }[verdict];
    return `${name} ${required}: ${predicted === undefined ? met : `${met} (${predicted})`}`;
  });
  const absence = state.absence === undefined ? [] : [state.absence];
  const parts = [[state.title], absence, lines, surfaces, requirements, CAUTION.split('\n')];
  return `${parts
    .filter((part) => part.length > 0)
    .map((part) => part.join('\n'))
    .join('\n\n')}\n`;
}

/** The same figures for a spreadsheet: label, value as shown, value in SI. */
export function figuresCsv(state: ReadoutState): string {
  const rows = figuresOf(state).map(({ label, value = '', amount }) => [label, value, amount ?? '']);
  return csv([['figure', 'value', 'value_SI'], ...rows]);
}

/** Those that apply, each once. */
function figuresOf({ headline, groups }: ReadoutState): readonly Figure[] {
  const labels = new Set<string>();
  return [...headline, ...groups.flatMap(({ figures }) => figures)].filter(({ label, value }) => {
    if (value === undefined || labels.has(label)) return false;
    labels.add(label);
    return true;
  });
}
